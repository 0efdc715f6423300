import { siteMap } from '$lib/server/db/schema';
import { comparableMaps } from '$lib/server/services/site-maps/comparable-maps';
import { compareSiteMaps } from '$lib/server/services/site-maps/compare-site-maps';
import { openSiteMap } from '$lib/server/services/site-maps/open-site-map';
import { saveSiteMap } from '$lib/server/services/site-maps/save-site-map';
import { eq } from 'drizzle-orm';
import { describe, expect, it } from 'vitest';
import { freshDatabase } from '../../../../support/fresh-database';
import { makeMember, makeTeam } from '../../../../support/people';

function setting() {
  const db = freshDatabase();
  const team = makeTeam(db);
  const [maker, observer] = (['experimenter', 'observer'] as const).map((role) =>
    makeMember(db, team.id, role)
  );
  const stranger = makeMember(db, makeTeam(db).id, 'lead');
  const save = (text: string, device: string | null, now: number, geometry: 'chain' | 'ring' = 'chain') => {
    const saved = saveSiteMap(
      db,
      maker,
      {
        fileName: 'sites.txt',
        bytes: new TextEncoder().encode(text),
        name: `map ${now}`,
        options: { geometry, alpha: 0.05, seek: 'any' },
        device,
        firmware: null,
        group: null,
        keepsKinks: false
      },
      now
    );
    if (!saved.ok) throw new Error(saved.reason);
    return saved.id;
  };
  return { db, maker, observer, stranger, save };
}

describe('two saved maps', () => {
  it('are compared in the order that is asked for', () => {
    const { db, observer, save } = setting();
    const before = save('011\n110\n000\n101\n'.repeat(50), null, 1);
    const after = save('110\n110\n000\n001\n'.repeat(50), null, 2);
    const compared = compareSiteMaps(db, observer, before, after);
    if (!compared.ok) throw new Error(compared.reason);
    expect([compared.earlier.id, compared.later.id]).toEqual([before, after]);
    // Sites 1 and 2: 25 % together of 50 % each before, which is correlation 0; always alike after.
    expect(compared.document.pairs[0]).toMatchObject({ first: 0, second: 1, earlier: 0, later: 1 });
    expect(compared.document.pairs[0].pHolm).toBeLessThan(1e-6);
    expect(compareSiteMaps(db, observer, after, before)).toMatchObject({
      document: { pairs: { 0: { earlier: 1, later: 0 } } }
    });
  });

  it('are refused in words where they are one, or of other sites', () => {
    const { db, observer, save } = setting();
    const [three, four] = [save('011\n110\n', null, 1), save('0110\n1101\n', null, 2)];
    const ring = save('011\n111\n', null, 3, 'ring');
    expect(compareSiteMaps(db, observer, three, three)).toMatchObject({
      why: expect.stringMatching(/itself/)
    });
    expect(compareSiteMaps(db, observer, three, four)).toMatchObject({
      why: expect.stringMatching(/3 sites and the other 4/)
    });
    expect(compareSiteMaps(db, observer, three, ring)).toMatchObject({
      why: expect.stringMatching(/chain .* ring/)
    });
  });

  it('are there for their team alone, and not while one is put aside', () => {
    const { db, observer, stranger, save } = setting();
    const [a, b] = [save('011\n110\n', null, 1), save('011\n111\n', null, 2)];
    for (const actor of [stranger, { ...stranger, teamId: observer.teamId }])
      expect(compareSiteMaps(db, actor, a, b)).toEqual({ ok: false, reason: 'unknown' });
    db.update(siteMap).set({ deletedAt: 5 }).where(eq(siteMap.id, b)).run();
    expect(compareSiteMaps(db, observer, a, b)).toEqual({ ok: false, reason: 'unknown' });
  });

  it('are offered where they have as many sites and the same geometry, the same device first', () => {
    const { db, observer, stranger, save } = setting();
    const [mine, old, other] = [
      save('011\n110\n', 'Marram', 1),
      save('011\n111\n', 'Marram', 2),
      save('011\n001\n', 'Kelp', 3)
    ];
    save('0110\n1101\n', 'Marram', 4);
    save('001\n111\n', 'Marram', 5, 'ring');
    const opened = openSiteMap(db, observer, mine);
    if (!opened.ok) throw new Error(opened.reason);
    expect(comparableMaps(db, observer, opened.map).map(({ id }) => id)).toEqual([old, other]);
    expect(comparableMaps(db, stranger, opened.map)).toEqual([]);
  });
});
