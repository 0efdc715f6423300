import { and, desc, eq, lt, or, type SQL } from 'drizzle-orm';
import type { SQLiteColumn } from 'drizzle-orm/sqlite-core';
import { readCursor, writeCursor, type Cursor } from './cursor';

export interface Page<Entry> {
  entries: Entry[];
  /** Cursor of the next page; null on the last. */
  next: string | null;
}

export type Paged<Entry> = { ok: true; page: Page<Entry> } | { ok: false; reason: 'bad-cursor' };

interface Columns {
  at: SQLiteColumn;
  id: SQLiteColumn;
}

/**
 * One page of a list, newest first, by moment and id of what came last and not by a number of rows: what is added or
 * taken away meanwhile makes nothing appear twice or be missed.
 *
 * @param fetch rows for a condition, an order and a limit
 */
export function onePage<Entry extends { id: string; createdAt: number }>(
  { at, id }: Columns,
  asked: { limit: number; after?: string },
  fetch: (where: SQL | undefined, order: SQL[], limit: number) => Entry[]
): Paged<Entry> {
  const cursor = asked.after === undefined ? null : readCursor(asked.after);
  if (asked.after !== undefined && cursor === null) return { ok: false, reason: 'bad-cursor' };
  const behind = (end: Cursor) => or(lt(at, end.at), and(eq(at, end.at), lt(id, end.id)));
  const rows = fetch(cursor ? behind(cursor) : undefined, [desc(at), desc(id)], asked.limit + 1);
  const entries = rows.slice(0, asked.limit);
  const last = entries.at(-1);
  const next = rows.length > asked.limit && last ? writeCursor({ at: last.createdAt, id: last.id }) : null;
  return { ok: true, page: { entries, next } };
}
