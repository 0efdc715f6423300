import { index, integer, sqliteTable, text, uniqueIndex } from 'drizzle-orm/sqlite-core';
import { createdAt, id, time } from './columns';
import { device } from './device';
import { person } from './person';

/** A firmware version of a device, in the device's order. */
export const firmwareVersion = sqliteTable(
  'firmware_version',
  {
    id: id(),
    deviceId: text('device_id')
      .notNull()
      .references(() => device.id, { onDelete: 'cascade' }),
    /** As datasets name it. */
    name: text('name').notNull(),
    /** Place in the order of the device, from 1; gaps are allowed. */
    place: integer('place').notNull(),
    notes: text('notes'),
    createdBy: text('created_by').references(() => person.id, { onDelete: 'set null' }),
    createdAt: createdAt(),
    updatedAt: time('updated_at').notNull()
  },
  (table) => [
    uniqueIndex('firmware_version_once').on(table.deviceId, table.name),
    index('firmware_version_in_order').on(table.deviceId, table.place)
  ]
);
