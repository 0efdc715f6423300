import { freshQuery, SORTS, type DatasetQuery } from '$lib/model/team/datasets/dataset-query';
import { person } from '$lib/server/db/schema';
import { listDatasets } from '$lib/server/services/datasets/list-datasets';
import { listFacets } from '$lib/server/services/datasets/list-facets';
import { listOrder } from '$lib/server/services/datasets/list-order';
import { listWhere } from '$lib/server/services/datasets/list-where';
import { dataset } from '$lib/server/db/schema';
import { eq } from 'drizzle-orm';
import { describe, expect, it } from 'vitest';
import { makeDataset, makeReport } from '../../../../support/datasets';
import { setting } from './support';

function filled() {
  const made = setting();
  const { db, lead, experimenter, stranger } = made;
  const add = (name: string, more: Parameters<typeof makeDataset>[2], actor = lead) =>
    makeDataset(db, actor, { name, ...more });
  const ids = {
    kelp: add('one', {
      device: 'Kelp',
      firmware: 'ebb 3.1',
      group: 'north edge',
      quenchTime: 2,
      quenchUnit: 'µs',
      shots: 30,
      createdAt: 1
    }),
    marram: add('two', {
      device: 'Marram',
      quenchTime: 900,
      quenchUnit: 'ns',
      measuredOn: '2026-03-14',
      shots: 10,
      createdAt: 2
    }),
    ring: add(
      'three',
      { geometry: 'ring-bonds', unit: 'pair', notes: '100 % of shots kept', shots: 20, createdAt: 3 },
      experimenter
    )
  };
  add('put aside', { deletedAt: 5 });
  add('theirs', { device: 'Kelp' }, stranger);
  makeReport(db, lead, ids.kelp, { number: 1, verdict: 'ruled-out' });
  makeReport(db, lead, ids.kelp, { number: 2, verdict: 'compatible' });
  makeReport(db, lead, ids.marram, { number: 1, verdict: 'ruled-out' });
  makeReport(db, lead, ids.marram, { number: 2, verdict: 'compatible', deletedAt: 9 });
  const names = (part: Partial<DatasetQuery>, actor = lead) =>
    listDatasets(db, actor, { ...freshQuery(), ...part }).rows.map(({ name }) => name);
  return { ...made, ids, names };
}

describe('listDatasets', () => {
  it('gives the team its own, newest first, with the number of reports and the last verdict', () => {
    const { db, lead, observer, names } = filled();
    expect(names({}, observer)).toEqual(['three', 'two', 'one']);
    const { rows, total, all } = listDatasets(db, lead, { ...freshQuery(), q: 'Kelp' });
    expect([rows.length, total, all]).toEqual([1, 1, 3]);
    expect(rows[0]).toMatchObject({ reports: 2, verdict: 'compatible', by: 'Ada Invented' });
    db.$client.close();
  });

  it.each<[string, Partial<DatasetQuery>, string[]]>([
    ['a word of the name', { q: 'TWO' }, ['two']],
    ['a word of the notes', { q: 'kept' }, ['three']],
    ['every word', { q: 'kelp ebb' }, ['one']],
    ['no pattern signs', { q: '%' }, ['three']],
    ['an underscore is itself', { q: '_' }, []],
    ['device', { device: 'Kelp' }, ['one']],
    ['firmware', { firmware: 'ebb 3.1' }, ['one']],
    ['group', { group: 'north edge' }, ['one']],
    ['words of the group', { q: 'NORTH' }, ['one']],
    ['geometry', { geometry: 'ring-bonds' }, ['three']],
    ['unit', { unit: 'pair' }, ['three']],
    ['first day', { from: '2026-03-14' }, ['two']],
    ['last day', { to: '2026-03-13' }, []],
    ['quench time across units', { quenchFrom: 0.9, quenchTo: 1, quenchUnit: 'µs' }, ['two']],
    ['quench time, lower end', { quenchFrom: 2000, quenchUnit: 'ns' }, ['one']],
    ['a unit of one’s own', { quenchFrom: 0, quenchUnit: 'J⁻¹' }, []],
    ['with report', { reports: 'with' }, ['two', 'one']],
    ['without', { reports: 'without' }, ['three']],
    ['last verdict', { verdict: 'compatible' }, ['one']],
    ['last verdict that is not put aside', { verdict: 'ruled-out' }, ['two']]
  ])('filters by %s', (_what, query, expected) => {
    const { db, names } = filled();
    expect(names(query)).toEqual(expected);
    db.$client.close();
  });

  it('filters by who saved it, and names people, devices and versions to choose from', () => {
    const { db, lead, experimenter, names } = filled();
    expect(names({ by: experimenter.personId })).toEqual(['three']);
    const facets = listFacets(db, lead);
    expect(facets.devices).toEqual(['Kelp', 'Marram']);
    expect(facets.firmwares).toEqual(['ebb 3.1']);
    expect(facets.groups).toEqual(['north edge']);
    expect(facets.people).toHaveLength(2);
    db.$client.close();
  });

  it('sorts by every column; what is not stated comes last either way', () => {
    const { db, lead, names } = filled();
    db.update(person).set({ name: 'Aaron' }).where(eq(person.id, lead.personId)).run();
    for (const sort of SORTS) expect([...names({ sort })].sort()).toEqual(['one', 'three', 'two']);
    expect(names({ sort: 'shots', order: 'up' })).toEqual(['two', 'three', 'one']);
    expect(names({ sort: 'shots' })).toEqual(['one', 'three', 'two']);
    expect(names({ sort: 'quench', order: 'up' })).toEqual(['two', 'one', 'three']);
    expect(names({ sort: 'quench' })).toEqual(['one', 'two', 'three']);
    expect(names({ sort: 'verdict', order: 'up' })).toEqual(['one', 'two', 'three']);
    expect(names({ sort: 'by' })).toEqual(['three', 'two', 'one']);
    db.$client.close();
  });

  it('pages without gaps or repeats, and answers a page too far with the last', () => {
    const { db, lead } = setting();
    for (let i = 0; i < 60; i++) makeDataset(db, lead, { name: 'same', createdAt: 1 });
    const page = (n: number) => listDatasets(db, lead, { ...freshQuery(), sort: 'name', size: 25, page: n });
    const seen = [1, 2, 3].flatMap((n) => page(n).rows.map(({ id }) => id));
    expect(new Set(seen).size).toBe(60);
    expect(page(9)).toMatchObject({ page: 3, total: 60 });
    db.$client.close();
  });

  it.each(['up', 'down'] as const)(
    'keeps datasets saved together in the order of their file: %s',
    (order) => {
      const { db, lead } = setting();
      const names = Array.from({ length: 12 }, (_, i) => `run ${i + 1}`);
      for (const name of names) makeDataset(db, lead, { name, createdAt: 7 });
      makeDataset(db, lead, { name: 'later', createdAt: 8 });
      const listed = (sort: DatasetQuery['sort']) =>
        listDatasets(db, lead, { ...freshQuery(), sort, order }).rows.map(({ name }) => name);
      expect(listed('created')).toEqual(order === 'down' ? ['later', ...names] : [...names, 'later']);
      // Equal in what is sorted by: newest first, and of one time the order of the file.
      expect(listed('shots')).toEqual(['later', ...names]);
      db.$client.close();
    }
  );

  it('shows nothing to people of another team', () => {
    const { db, lead, stranger, names } = filled();
    expect(names({}, { ...stranger, teamId: lead.teamId })).toEqual([]);
    expect(names({}, stranger)).toEqual(['theirs']);
    db.$client.close();
  });

  it.each(SORTS)('finds and sorts by an index alone: %s', (sort) => {
    const { db, lead } = filled();
    const query = { ...freshQuery(), sort, q: 'word', quenchFrom: 1 };
    const built = db
      .select({ id: dataset.id })
      .from(dataset)
      .where(listWhere(lead, query))
      .orderBy(...listOrder(query))
      .toSQL();
    const plan = db.$client.prepare(`explain query plan ${built.sql}`).all(...built.params) as {
      detail: string;
    }[];
    const main = plan.filter(({ detail }) => /\bdataset\b/.test(detail));
    expect(main.map(({ detail }) => detail)).toEqual([
      expect.stringContaining('USING COVERING INDEX dataset_for_list')
    ]);
    db.$client.close();
  });
});
