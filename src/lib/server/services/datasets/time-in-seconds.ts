import { sql, type SQL } from 'drizzle-orm';
import type { SQLiteColumn } from 'drizzle-orm/sqlite-core';

/** A time column in seconds where its unit is one of time, else as it stands, for the order of a table. */
export function timeInSeconds(time: SQLiteColumn, unit: SQLiteColumn): SQL {
  return sql`(${time} * case ${unit} when 'ns' then 1e-9 when 'µs' then 1e-6 when 'us' then 1e-6 when 'ms' then 1e-3 else 1 end)`;
}
