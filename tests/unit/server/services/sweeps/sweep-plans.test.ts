import type { Database } from '$lib/server/db/client';
import { sweep } from '$lib/server/db/schema';
import { newId } from '$lib/server/db/new-id';
import { listSweeps } from '$lib/server/services/sweeps/list-sweeps';
import { pageOfSweeps } from '$lib/server/services/sweeps/page-of-sweeps';
import { saveSweep } from '$lib/server/services/sweeps/save-sweep';
import { sweepableDatasets } from '$lib/server/services/sweeps/sweepable-datasets';
import { readSweepFilter } from '$lib/model/team/sweeps/sweep-filter';
import { expect, it } from 'vitest';
import { makeDataset } from '../../../../support/datasets';
import { asked, setting } from '../../../../support/sweeps';

/** How SQLite goes about every query that `work` makes, as it says itself, a line a table. */
function plansOf(db: Database, work: () => void): string[] {
  const client = db.$client;
  const prepare = client.prepare.bind(client);
  const made: string[] = [];
  client.prepare = ((text: string) => {
    made.push(text);
    return prepare(text);
  }) as typeof client.prepare;
  work();
  client.prepare = prepare as typeof client.prepare;
  return made
    .filter((text) => /^select/i.test(text))
    .flatMap((text) => {
      const values = [...text.matchAll(/\?/g)].map(() => 1);
      const rows = prepare(`explain query plan ${text}`).all(...values) as { detail: string }[];
      return rows.map(({ detail }) => detail);
    });
}

/** Walks through a whole table. */
const walks = (plans: string[]) =>
  plans.filter((line) => /^SCAN (dataset|sweep|report|link)\b/.test(line) && !/USING .*INDEX/.test(line));

it('a hundred datasets are chosen and offered, and sweeps listed, without a walk through a table', () => {
  const { db, lead } = setting();
  const ids = Array.from({ length: 100 }, (_, i) =>
    makeDataset(db, lead, {
      name: `quench ${i}`,
      counts: '{"kind":"histogram","counts":[[0,60],[1,25],[2,10],[3,5]],"lump":null}',
      device: 'Invented ring',
      quenchTime: 1 + i,
      quenchUnit: 'µs'
    })
  );
  const filter = readSweepFilter(new URLSearchParams('device=Invented ring'));
  const offered = plansOf(db, () => expect(sweepableDatasets(db, lead, filter).rows).toHaveLength(100));
  expect(walks(offered)).toEqual([]);
  expect(offered.join('\n')).toMatch(/dataset USING INDEX dataset_/);

  const chosen = plansOf(db, () => expect(saveSweep(db, lead, asked(ids)).ok).toBe(true));
  expect(walks(chosen)).toEqual([]);
  expect(chosen.join('\n')).toMatch(/SEARCH dataset USING INDEX/);

  const [row] = db.select().from(sweep).all();
  for (let i = 0; i < 60; i++)
    db.insert(sweep)
      .values({ ...row, id: newId(), createdAt: 10 + i })
      .run();
  const listed = plansOf(db, () => {
    expect(listSweeps(db, lead, 2).rows).toHaveLength(25);
    const first = pageOfSweeps(db, lead, { limit: 25 });
    if (!first.ok || first.page.next === null) throw new Error('one page');
    pageOfSweeps(db, lead, { limit: 25, after: first.page.next });
  });
  expect(walks(listed)).toEqual([]);
  expect(listed.filter((line) => line.includes('sweep_by_team')).length).toBeGreaterThanOrEqual(3);
});

it('would notice a walk', () => {
  const { db } = setting();
  const plans = plansOf(db, () => db.$client.prepare('select id from sweep where notes = ?').all('x'));
  expect(walks(plans)).toHaveLength(1);
});
