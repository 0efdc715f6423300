import { and, eq, inArray } from 'drizzle-orm';
import type { Database } from '../../db/client';
import { event } from '../../db/schema';

/** Who first made what was imported, as its archive told: by id of the dataset, report or sweep. */
export function firstMakers(db: Database, teamId: string): Map<string, string> {
  const rows = db
    .select({ thing: event.thing, detail: event.detail })
    .from(event)
    .where(
      and(
        eq(event.teamId, teamId),
        inArray(event.action, ['dataset.import', 'report.import', 'sweep.import'])
      )
    )
    .all();
  const found = new Map<string, string>();
  for (const { thing, detail } of rows) {
    const { madeBy } = JSON.parse(detail ?? '{}') as { madeBy?: unknown };
    if (thing !== null && typeof madeBy === 'string') found.set(thing, madeBy);
  }
  return found;
}

/** A person as text. */
export const asText = (name: string, email: string): string => `${name} <${email}>`;
