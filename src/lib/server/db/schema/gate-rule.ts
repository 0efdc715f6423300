import { integer, real, sqliteTable, text } from 'drizzle-orm/sqlite-core';
import { time } from './columns';
import { device } from './device';
import { firmwareVersion } from './firmware-version';
import { person } from './person';

/** What a version of a device has to hold to pass: one rule a device. */
export const gateRule = sqliteTable('gate_rule', {
  deviceId: text('device_id')
    .primaryKey()
    .references(() => device.id, { onDelete: 'cascade' }),
  /** Null once that version is removed; its name stays, so that the page can say which it was. */
  referenceId: text('reference_id').references(() => firmwareVersion.id, { onDelete: 'set null' }),
  referenceName: text('reference_name').notNull(),
  /** Excess of variance over the ceiling that is allowed, as a fraction: 0.1 is ten per cent. */
  tolerance: real('tolerance').notNull(),
  alpha: real('alpha').notNull(),
  /** Groups that count, as a JSON list; null for every group of the reference or the version. */
  groups: text('groups'),
  /** Grows with every change: the second of two editors is told. */
  version: integer('version').notNull().default(1),
  updatedBy: text('updated_by').references(() => person.id, { onDelete: 'set null' }),
  updatedAt: time('updated_at').notNull()
});
