import { index, integer, real, sqliteTable, text } from 'drizzle-orm/sqlite-core';
import { createdAt, id, time } from './columns';
import { originalFile } from './original-file';
import { person } from './person';
import { team } from './team';

/** One set of counts with the conditions it was taken under. The counts never change; the conditions may. */
export const dataset = sqliteTable(
  'dataset',
  {
    id: id(),
    teamId: text('team_id')
      .notNull()
      .references(() => team.id, { onDelete: 'cascade' }),
    name: text('name').notNull(),
    fileId: text('file_id')
      .notNull()
      .references(() => originalFile.id),
    /** How the file was read: the choices of formats/choices as JSON, so that it can be read again the same way. */
    reading: text('reading').notNull(),
    /** Which dataset of a file that holds several; null when it holds one. */
    part: text('part'),
    /** CountData as JSON: what diagnose() takes. */
    counts: text('counts').notNull(),
    kind: text('kind', { enum: ['histogram', 'shots'] }).notNull(),
    /** The digest of the canonical histogram, as in a diagnosis document. */
    digest: text('digest').notNull(),
    shots: integer('shots').notNull(),
    /** Sample mean of the counts, for the table. */
    mean: real('mean').notNull(),
    largest: integer('largest').notNull(),
    // Conditions.
    device: text('device'),
    firmware: text('firmware'),
    /** Part of the device that was measured: a group of qubits, a register, a region. */
    group: text('group_name'),
    quenchTime: real('quench_time'),
    quenchUnit: text('quench_unit'),
    holdTime: real('hold_time'),
    holdUnit: text('hold_unit'),
    geometry: text('geometry', { enum: ['sites', 'open-bonds', 'ring-bonds'] }).notNull(),
    unit: text('unit', { enum: ['defect', 'pair'] }).notNull(),
    /** Largest possible count; null when unknown. */
    trials: integer('trials'),
    trialsWhy: text('trials_why'),
    misread: real('misread'),
    /** One standard uncertainty of that rate. */
    misreadUncertainty: real('misread_uncertainty'),
    /** Counts kept, as 0-4 or 1-; null when no shot was dropped by its count. */
    kept: text('kept'),
    postSelection: text('post_selection'),
    /** Day of the measurement, YYYY-MM-DD. */
    measuredOn: text('measured_on'),
    notes: text('notes'),
    /** Grows with every edit of the conditions: the second of two editors is told. */
    version: integer('version').notNull().default(1),
    createdBy: text('created_by').references(() => person.id, { onDelete: 'set null' }),
    createdAt: createdAt(),
    updatedAt: time('updated_at').notNull(),
    /** Put aside: gone from every list, back for 30 days. */
    deletedAt: time('deleted_at'),
    deletedBy: text('deleted_by').references(() => person.id, { onDelete: 'set null' })
  },
  (table) => [
    // Holds every column that the team's table filters, searches or sorts by: counts lie in the middle of a row, and a
    // row with a long shot list would be walked through page by page to reach what stands behind them.
    index('dataset_for_list').on(
      table.teamId,
      table.deletedAt,
      table.createdAt,
      table.id,
      table.name,
      table.device,
      table.firmware,
      table.group,
      table.quenchTime,
      table.quenchUnit,
      table.geometry,
      table.unit,
      table.trials,
      table.shots,
      table.mean,
      table.largest,
      table.measuredOn,
      table.createdBy,
      table.notes
    ),
    index('dataset_by_device').on(
      table.teamId,
      table.deletedAt,
      table.device,
      table.firmware,
      table.group,
      table.createdAt
    ),
    index('dataset_by_digest').on(table.teamId, table.digest),
    index('dataset_by_file').on(table.fileId)
  ]
);
