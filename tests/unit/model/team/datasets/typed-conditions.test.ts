import { bareConditions, conditionsSchema } from '$lib/model/team/datasets/conditions';
import { freshQuery, readDatasetQuery, writeDatasetQuery } from '$lib/model/team/datasets/dataset-query';
import { readTypedConditions } from '$lib/model/team/datasets/read-typed-conditions';
import { typedConditions, typedConditionsSchema } from '$lib/model/team/datasets/typed-conditions';
import { readSettings } from '$lib/page/read-settings';
import { freshSettings } from '$lib/page/settings';
import { describe, expect, it } from 'vitest';

const full = {
  ...bareConditions('a name'),
  device: 'Kelp',
  quenchTime: 2.5,
  quenchUnit: 'µs',
  trials: 1000,
  misread: 0.05,
  misreadUncertainty: 0.004,
  kept: '1-',
  measuredOn: '2026-03-14'
};

describe('conditions in a form', () => {
  it('come back as they were', () => {
    expect(readTypedConditions(typedConditions(full))).toEqual({ ok: true, conditions: full });
  });

  it('take numbers as people type them', () => {
    const typed = {
      ...typedConditions(full),
      quenchTime: '2,5',
      trials: '1 000',
      misread: '5e-2',
      misreadUncertainty: '0,004',
      kept: ' 1 – '
    };
    expect(readTypedConditions(typed)).toEqual({ ok: true, conditions: full });
    expect(readTypedConditions({ ...typed, trials: 'unknown' })).toMatchObject({
      conditions: { trials: null }
    });
  });

  it('name each wrong field and change nothing typed', () => {
    const typed = {
      ...typedConditions(full),
      name: ' ',
      quenchTime: 'fast',
      trials: '1.5',
      misread: '0.5',
      measuredOn: '2026-02-30',
      geometry: 'cube',
      notes: 'x'.repeat(5001)
    };
    const read = readTypedConditions(typed);
    expect(read.ok ? [] : Object.keys(read.problems).sort()).toEqual(
      ['geometry', 'measuredOn', 'misread', 'name', 'notes', 'quenchTime', 'trials'].sort()
    );
    const parsed = typedConditionsSchema.safeParse(typed);
    expect(parsed.error?.issues.map(({ path }) => path[0]).sort()).toEqual(
      ['geometry', 'measuredOn', 'misread', 'name', 'notes', 'quenchTime', 'trials'].sort()
    );
  });

  it('say of a rate, its uncertainty and a cut what the first page says', async () => {
    const wrong = { misread: '0.5', misreadUncertainty: '0.5', kept: 'small ones' };
    const read = readTypedConditions({ ...typedConditions(full), ...wrong });
    const first = await readSettings({ ...freshSettings(), ...wrong });
    expect(read.ok || first.ok).toBe(false);
    expect(!read.ok && read.problems).toEqual(!first.ok && first.problems);
    expect(!read.ok && Object.keys(read.problems)).toHaveLength(3);
  });

  it('are refused with anything else beside them', () => {
    expect(conditionsSchema.safeParse({ ...full, teamId: 'x' }).success).toBe(false);
    expect(conditionsSchema.safeParse({ ...full, trials: Infinity }).success).toBe(false);
  });
});

describe('the query in an address', () => {
  it('comes back as it was, and a fresh one is empty', () => {
    expect(writeDatasetQuery(freshQuery())).toBe('');
    const query = {
      ...freshQuery(),
      q: 'a b',
      quenchFrom: 2.5,
      quenchUnit: 'ns',
      page: 3,
      sort: 'mean' as const
    };
    expect(readDatasetQuery(new URLSearchParams(writeDatasetQuery(query)))).toEqual(query);
  });

  it('drops what is not understood', () => {
    const search = new URLSearchParams('page=-1&size=7&sort=x&from=soon&quenchFrom=x&geometry=cube&q=kept');
    expect(readDatasetQuery(search)).toEqual({ ...freshQuery(), q: 'kept' });
  });
});
