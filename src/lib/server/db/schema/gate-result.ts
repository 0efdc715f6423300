import { index, sqliteTable, text, uniqueIndex } from 'drizzle-orm/sqlite-core';
import { createdAt, id } from './columns';
import { firmwareVersion } from './firmware-version';
import { team } from './team';

/** A gate as it was decided for one version from one set of inputs; rows are only added. */
export const gateResult = sqliteTable(
  'gate_result',
  {
    id: id(),
    teamId: text('team_id')
      .notNull()
      .references(() => team.id, { onDelete: 'cascade' }),
    versionId: text('version_id')
      .notNull()
      .references(() => firmwareVersion.id, { onDelete: 'cascade' }),
    /** sha256 of rule, counts and engine: the same inputs are decided once. */
    inputs: text('inputs').notNull(),
    outcome: text('outcome', { enum: ['passed', 'failed', 'undecided'] }).notNull(),
    /** The gate document, severalty.gate/1. */
    document: text('document').notNull(),
    engineVersion: text('engine_version').notNull(),
    createdAt: createdAt()
  },
  (table) => [
    uniqueIndex('gate_result_once').on(table.versionId, table.inputs),
    index('gate_result_last').on(table.versionId, table.createdAt)
  ]
);
