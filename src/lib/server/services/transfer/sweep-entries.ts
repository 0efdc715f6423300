import { and, asc, eq, isNull, sql } from 'drizzle-orm';
import type { SweepsFile } from '$lib/model/team/transfer/archive-schema';
import type { Database } from '../../db/client';
import { person, sweep } from '../../db/schema';
import { numbered, type NumberedEntries } from './dataset-entries';
import { asText, firstMakers } from './first-makers';

/** The sweeps of a team, oldest first, and what is kept beside each document. */
export function sweepEntries(db: Database, teamId: string): NumberedEntries & { file: SweepsFile } {
  const rows = db
    .select({
      id: sweep.id,
      name: sweep.name,
      notes: sweep.notes,
      sha256: sweep.sha256,
      options: sweep.options,
      datasets: sweep.datasets,
      engineVersion: sweep.engineVersion,
      createdAt: sweep.createdAt,
      by: person.name,
      email: person.email
    })
    .from(sweep)
    .leftJoin(person, eq(person.id, sweep.createdBy))
    .where(and(eq(sweep.teamId, teamId), isNull(sweep.deletedAt)))
    .orderBy(asc(sweep.createdAt), asc(sql`"sweep".rowid`))
    .all();
  const imported = firstMakers(db, teamId);
  const madeBy: Record<string, string> = {};
  const file = rows.map(({ id, by, email, createdAt, options, datasets, ...row }, i): SweepsFile[number] => {
    const path = numbered('sweeps', i);
    const maker = imported.get(id) ?? (by !== null && email !== null ? asText(by, email) : undefined);
    if (maker) madeBy[path] = maker;
    return {
      file: path,
      ...row,
      options: JSON.parse(options) as SweepsFile[number]['options'],
      datasets: JSON.parse(datasets) as SweepsFile[number]['datasets'],
      createdAt: new Date(createdAt).toISOString()
    };
  });
  const entries = rows.map(({ id }, i) => ({
    path: numbered('sweeps', i),
    bytes: () => {
      const found = db.select({ text: sweep.document }).from(sweep).where(eq(sweep.id, id)).get();
      if (!found) throw new Error('A sweep was removed while it was being exported.');
      return new TextEncoder().encode(found.text);
    }
  }));
  return { entries, paths: new Map(rows.map(({ id }, i) => [id, numbered('sweeps', i)])), madeBy, file };
}
