import type { JobList, JobRow } from '$lib/model/team/jobs/job-row';
import { patchList, patchStatuses } from '$lib/page/team/jobs/patch-job';
import { describe, expect, it } from 'vitest';

const row = (id: string, more: Partial<JobRow> = {}): JobRow => ({
  id,
  status: 'running',
  dataset: { id: `of ${id}`, name: 'Dice' },
  share: 0.1,
  step: 'fit',
  elapsed: 5,
  reason: null,
  report: null,
  by: null,
  createdAt: 10,
  endedAt: null,
  ...more
});

const list: JobList = { rows: [row('a'), row('b')], total: 2, queued: 0, running: 2, page: 1, size: 50 };

describe('patchList', () => {
  it('puts what is new in its place, and changes nothing in place', () => {
    const patched = patchList(list, row('b', { share: 0.9 }));
    expect(patched.rows.map(({ id, share }) => [id, share])).toEqual([
      ['a', 0.1],
      ['b', 0.9]
    ]);
    expect(list.rows[1].share).toBe(0.1);
  });

  it('gives the same list for a job that is not in it', () => {
    expect(patchList(list, row('c'))).toBe(list);
  });
});

describe('patchStatuses', () => {
  it('takes the newer job of a dataset, and what is new of the one shown', () => {
    const shown = { 'of a': row('a') };
    expect(patchStatuses(shown, row('a', { status: 'done' }))['of a'].status).toBe('done');
    expect(
      patchStatuses(shown, row('z', { dataset: { id: 'of a', name: 'Dice' }, createdAt: 11 }))['of a'].id
    ).toBe('z');
    expect(patchStatuses(shown, row('y', { dataset: { id: 'of a', name: 'Dice' }, createdAt: 9 }))).toBe(
      shown
    );
  });
});
