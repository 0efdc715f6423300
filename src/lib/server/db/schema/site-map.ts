import { index, integer, real, sqliteTable, text } from 'drizzle-orm/sqlite-core';
import { createdAt, id, time } from './columns';
import { dataset } from './dataset';
import { originalFile } from './original-file';
import { person } from './person';
import { team } from './team';

/** Correlations of sites found in one file of site-resolved shots. The counts of the same shots are a dataset. */
export const siteMap = sqliteTable(
  'site_map',
  {
    id: id(),
    teamId: text('team_id')
      .notNull()
      .references(() => team.id, { onDelete: 'cascade' }),
    name: text('name').notNull(),
    fileId: text('file_id')
      .notNull()
      .references(() => originalFile.id),
    /** Counts of excited sites, and of kinks, of the same shots; null once that dataset is removed. */
    countsId: text('counts_id').references(() => dataset.id, { onDelete: 'set null' }),
    kinksId: text('kinks_id').references(() => dataset.id, { onDelete: 'set null' }),
    geometry: text('geometry', { enum: ['chain', 'ring'] }).notNull(),
    sites: integer('sites').notNull(),
    shots: integer('shots').notNull(),
    alpha: real('alpha').notNull(),
    device: text('device'),
    firmware: text('firmware'),
    group: text('group_name'),
    /** The document, severalty.sites/1, byte for byte. */
    document: text('document').notNull(),
    sha256: text('sha256').notNull(),
    engineVersion: text('engine_version').notNull(),
    createdBy: text('created_by').references(() => person.id, { onDelete: 'set null' }),
    createdAt: createdAt(),
    deletedAt: time('deleted_at'),
    deletedBy: text('deleted_by').references(() => person.id, { onDelete: 'set null' })
  },
  (table) => [
    index('site_map_by_team').on(table.teamId, table.deletedAt, table.createdAt),
    index('site_map_by_device').on(table.teamId, table.deletedAt, table.device, table.firmware)
  ]
);
