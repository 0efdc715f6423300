import { index, integer, sqliteTable, text } from 'drizzle-orm/sqlite-core';
import { createdAt, id, time } from './columns';
import { dataset } from './dataset';
import { person } from './person';
import { team } from './team';

/** A diagnosis document kept as it was made. A trigger refuses every change of what it says. */
export const report = sqliteTable(
  'report',
  {
    id: id(),
    teamId: text('team_id')
      .notNull()
      .references(() => team.id, { onDelete: 'cascade' }),
    datasetId: text('dataset_id')
      .notNull()
      .references(() => dataset.id, { onDelete: 'cascade' }),
    /** Counts up within a dataset: "report 2". */
    number: integer('number').notNull(),
    /** The document, byte for byte as documentText writes it. */
    document: text('document').notNull(),
    sha256: text('sha256').notNull(),
    /** DiagnoseOptions as JSON. */
    options: text('options').notNull(),
    engineVersion: text('engine_version').notNull(),
    verdict: text('verdict', { enum: ['compatible', 'ruled-out', 'undecided'] }).notNull(),
    /** The conditions of the dataset when the report was made, as JSON: these may change later. */
    conditions: text('conditions').notNull(),
    createdBy: text('created_by').references(() => person.id, { onDelete: 'set null' }),
    createdAt: createdAt(),
    deletedAt: time('deleted_at'),
    deletedBy: text('deleted_by').references(() => person.id, { onDelete: 'set null' })
  },
  (table) => [
    index('report_by_dataset').on(table.datasetId, table.number),
    // The last verdict of a dataset without opening a report, whose document lies before it in the row.
    index('report_last').on(table.datasetId, table.deletedAt, table.number, table.verdict),
    index('report_by_team').on(table.teamId, table.deletedAt, table.createdAt)
  ]
);
