import { and, eq } from 'drizzle-orm';
import type { Database } from '../../db/client';
import { watch } from '../../db/schema';
import { readAbout } from './watch-about';

/** Whether somebody hears of every remark in a team by their watch. */
export function watchesRemarks(db: Pick<Database, 'select'>, personId: string, teamId: string): boolean {
  const mine = and(eq(watch.personId, personId), eq(watch.teamId, teamId));
  const found = db.select({ about: watch.about }).from(watch).where(mine).get();
  return found !== undefined && readAbout(found.about).remark !== undefined;
}
