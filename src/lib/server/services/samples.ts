import { asc, eq } from 'drizzle-orm';
import type { Database } from '../db/client';
import { sample } from '../db/schema';

export type Sample = typeof sample.$inferSelect;
/** What a list shows: everything but the file itself. */
export type SampleEntry = Pick<
  Sample,
  'slug' | 'title' | 'about' | 'cause' | 'source' | 'invented' | 'trials' | 'unit' | 'geometry' | 'fileName'
>;

/** All samples in their order, without their text. */
export function listSamples(db: Database): SampleEntry[] {
  return db
    .select({
      slug: sample.slug,
      title: sample.title,
      about: sample.about,
      cause: sample.cause,
      source: sample.source,
      invented: sample.invented,
      trials: sample.trials,
      unit: sample.unit,
      geometry: sample.geometry,
      fileName: sample.fileName
    })
    .from(sample)
    .orderBy(asc(sample.order))
    .all();
}

/** One sample with its text. */
export function sampleBySlug(
  db: Database,
  slug: string
): { ok: true; sample: Sample } | { ok: false; reason: 'unknown' } {
  const found = db.select().from(sample).where(eq(sample.slug, slug)).get();
  return found ? { ok: true, sample: found } : { ok: false, reason: 'unknown' };
}
