import { dataset } from '$lib/server/db/schema';
import { pageOfDatasets } from '$lib/server/services/datasets/page-of-datasets';
import { readCursor, writeCursor } from '$lib/server/services/paging/cursor';
import { eq } from 'drizzle-orm';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { makeDataset } from '../../../../support/datasets';
import { freshDatabase } from '../../../../support/fresh-database';
import { makeMember, makeTeam } from '../../../../support/people';

describe('cursors', () => {
  it('come back as they went', () => {
    const id = fc.string({
      unit: fc.constantFrom(...'abcdefghijkmnpqrstuvwxyz23456789'),
      minLength: 26,
      maxLength: 26
    });
    fc.assert(
      fc.property(fc.nat({ max: 4e12 }), id, (at, id) => {
        expect(readCursor(writeCursor({ at, id }))).toEqual({ at, id });
      })
    );
  });

  it('are refused when they are none', () => {
    for (const text of ['', 'x', 'null', '%00', Buffer.from('1.short').toString('base64url')])
      expect(readCursor(text)).toBeNull();
  });
});

describe('pages', () => {
  it('give every entry once, newest first, though many have the same moment and others come and go meanwhile', () => {
    const db = freshDatabase();
    const actor = makeMember(db, makeTeam(db).id, 'observer');
    const stranger = makeMember(db, makeTeam(db).id, 'lead');
    makeDataset(db, stranger, { createdAt: 5 });
    const ids = Array.from({ length: 23 }, (_, i) => makeDataset(db, actor, { createdAt: 1 + (i % 3) }));
    const put = makeDataset(db, actor, { createdAt: 9, deletedAt: 9 });
    const seen: { id: string; createdAt: number }[] = [];
    let after: string | undefined;
    let pages = 0;
    do {
      const found = pageOfDatasets(db, actor, { limit: 5, after });
      if (!found.ok) throw new Error(found.reason);
      seen.push(...found.page.entries);
      after = found.page.next ?? undefined;
      pages += 1;
      makeDataset(db, actor, { createdAt: 100 + pages });
      if (pages === 1) db.update(dataset).set({ deletedAt: 1 }).where(eq(dataset.id, seen[0].id)).run();
    } while (after);
    expect(seen.map(({ id }) => id).sort()).toEqual([...ids].sort());
    expect(seen.map(({ id }) => id)).not.toContain(put);
    expect(pages).toBe(5);
    for (let i = 1; i < seen.length; i += 1)
      expect(seen[i - 1].createdAt).toBeGreaterThanOrEqual(seen[i].createdAt);
  });
});
