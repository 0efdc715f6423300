import { sql, type SQL } from 'drizzle-orm';
import type { SQLiteColumn } from 'drizzle-orm/sqlite-core';
import { event } from '../../db/schema';

/**
 * Events of a team after one, for those who look every second whether there are any. The plus keeps SQLite from the index
 * by team, by which it would read all of a team's events to find that none is new: 14 ms for 200 000. By number it reads
 * the new ones alone.
 */
export const newerEvents = (teamId: SQLiteColumn | string, lastEvent: SQLiteColumn | number): SQL =>
  sql`(+${event.teamId} = ${teamId} and ${event.id} > ${lastEvent})`;
