import { tickedDatasets } from '$lib/model/team/sweeps/ticked-datasets';
import { describe, expect, it } from 'vitest';

const row = (id: string, more: Partial<Parameters<typeof tickedDatasets>[0][number]> = {}) => ({
  ...{ id, device: 'D1', firmware: '1', group: 'a', unit: 'defect', time: 5 },
  ...more
});
const ticked = (...rows: ReturnType<typeof row>[]) => tickedDatasets(rows, { datasets: [] });

describe('datasets ticked at first', () => {
  it.each([
    ['device', { device: 'D2' }],
    ['firmware', { firmware: null }],
    ['group', { group: 'b' }],
    ['unit', { unit: 'pair' }],
    ['a time of zero', { time: 0 }],
    ['a time below zero', { time: -2 }]
  ])('leave out one that differs in %s', (_, more) => {
    expect(ticked(row('x', more), row('y'), row('z'))).toEqual(['y', 'z']);
  });

  it('are the largest set that is alike, the first of several', () => {
    const others = [row('d', { device: 'D2' }), row('e', { device: 'D2' })];
    expect(ticked(row('a'), ...others)).toEqual(['d', 'e']);
    expect(ticked(row('a'), row('b'), ...others)).toEqual(['a', 'b']);
    expect(ticked(row('a', { device: null, firmware: null, group: null }))).toEqual(['a']);
    expect(ticked()).toEqual([]);
  });

  it('are all of those that were handed over', () => {
    const rows = [row('a'), row('b', { device: 'D2' })];
    expect(tickedDatasets(rows, { datasets: ['a', 'b'] })).toEqual(['a', 'b']);
  });
});
