import { eq } from 'drizzle-orm';
import { describe, expect, it } from 'vitest';
import { sample } from '$lib/server/db/schema';
import { CATALOGUE } from '$lib/server/services/sample-catalogue';
import { listSamples, sampleBySlug } from '$lib/server/services/samples';
import { seedSamples } from '$lib/server/services/seed-samples';
import { freshDatabase } from '../../../support/fresh-database';

describe('samples', () => {
  it('are seeded in the order of the catalogue, without their text in the list', () => {
    const db = freshDatabase();
    expect(seedSamples(db)).toBe(CATALOGUE.length);
    const list = listSamples(db);
    expect(list.map(({ slug }) => slug)).toEqual(CATALOGUE.map(({ slug }) => slug));
    expect(list.every((entry) => !('text' in entry))).toBe(true);
  });

  it('carry what the form needs, and say whether they are invented', () => {
    const db = freshDatabase();
    seedSamples(db);
    for (const entry of listSamples(db)) {
      const found = sampleBySlug(db, entry.slug);
      if (!found.ok) throw new Error(`${entry.slug} is listed but not found`);
      expect(found.sample.text.length, entry.slug).toBeGreaterThan(20);
      expect(/^# Invented data/.test(found.sample.text), entry.slug).toBe(entry.invented);
      expect(entry.source.length, entry.slug).toBeGreaterThan(10);
    }
  });

  it('follow the catalogue at every start: changed rows are mended, foreign ones go, the rest keep their id', () => {
    const db = freshDatabase();
    seedSamples(db);
    const before = sampleBySlug(db, CATALOGUE[1].slug);
    db.update(sample).set({ title: 'spoilt' }).where(eq(sample.slug, CATALOGUE[0].slug)).run();
    const row = db.select().from(sample).get();
    if (!row) throw new Error('nothing was seeded');
    db.insert(sample)
      .values({ ...row, id: undefined, slug: 'dropped' })
      .run();
    seedSamples(db);
    expect(listSamples(db).map(({ title }) => title)).toEqual(CATALOGUE.map(({ title }) => title));
    expect(sampleBySlug(db, CATALOGUE[1].slug)).toEqual(before);
  });

  it('say so when there is none of that name', () => {
    expect(sampleBySlug(freshDatabase(), 'nothing')).toEqual({ ok: false, reason: 'unknown' });
  });

  it('name the file that is missing', () => {
    expect(() => seedSamples(freshDatabase(), 'tests')).toThrow(
      /fixtures\/demo\/independent-sites\.csv is missing/
    );
  });
});
