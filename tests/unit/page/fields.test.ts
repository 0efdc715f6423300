import { readCounts } from '$lib/formats/read-counts';
import { readNumber } from '$lib/page/read-number';
import { readSettings, readTrials } from '$lib/page/read-settings';
import { freshSettings } from '$lib/page/settings';
import { summaryOfData } from '$lib/page/summary-of-data';
import { textOfData } from '$lib/page/text-of-data';
import { timeLeft } from '$lib/page/time-left';
import { tooLarge } from '$lib/page/too-large';
import { defaultOptions } from '$lib/stats/default-options';
import type { CountData } from '$lib/stats/types';
import { describe, expect, it } from 'vitest';

describe('what is typed into the fields', () => {
  it.each([
    ['0.05', 0.05],
    ['0,05', 0.05],
    ['1e-3', 0.001],
    ['1 999', 1999],
    ['1\u2009999', 1999],
    ['\u22122', -2],
    ['1,000.5', null],
    ['12x', null],
    ['', null],
    ['Infinity', null]
  ])('“%s” is %s', (typed, value) => expect(readNumber(typed)).toBe(value));

  it.each([
    ['', null],
    ['unknown', null],
    [' Unknown ', null],
    ['12', 12],
    ['1e3', 1000],
    ['0', undefined],
    ['2.5', undefined],
    ['many', undefined],
    ['2000000000', undefined]
  ])('trials “%s” are %s', (typed, value) => expect(readTrials(typed)).toBe(value));

  it('a fresh page asks for the engine’s own defaults', async () => {
    expect(await readSettings(freshSettings())).toEqual({ ok: true, options: defaultOptions });
  });
  it('says of each field what is wrong with it, and of no other', async () => {
    const read = await readSettings({
      ...freshSettings(),
      alpha: '0.7',
      misread: 'low',
      supplied: '0.2 1.4',
      resamples: '5'
    });
    expect(read.ok).toBe(false);
    if (!read.ok) {
      expect(Object.keys(read.problems).sort()).toEqual(['alpha', 'misread', 'resamples', 'supplied']);
      expect(read.problems.supplied).toMatch(/above 1/);
    }
  });
});

describe('the uncertainty of the misread chance', () => {
  it('goes to the engine with the chance, and is refused without it or beyond reach', async () => {
    const stated = { ...freshSettings(), misread: '0.01', misreadUncertainty: '0.001' };
    const read = await readSettings(stated);
    expect(read.ok && read.options).toMatchObject({ misread: 0.01, misreadUncertainty: 0.001 });
    for (const [changed, field, words] of [
      [{ misread: '' }, 'misreadUncertainty', /chance to misread a site as well/],
      [{ misreadUncertainty: '0.5' }, 'misreadUncertainty', /below 0\.5/],
      [{ misread: '0.5' }, 'misread', /at 0\.5 the reading says nothing/]
    ] as const) {
      const refused = await readSettings({ ...stated, ...changed });
      expect(refused.ok).toBe(false);
      if (!refused.ok) expect(refused.problems[field]).toMatch(words);
    }
  });
});

describe('counts as text', () => {
  it.each<[string, CountData]>([
    [
      'a histogram',
      {
        kind: 'histogram',
        counts: [
          [0, 5],
          [3, 2 ** 40],
          [7, 1]
        ],
        lump: null
      }
    ],
    [
      'a lump',
      {
        kind: 'histogram',
        counts: [
          [0, 5],
          [3, 2]
        ],
        lump: { from: 9, shots: 4 }
      }
    ],
    ['one row', { kind: 'histogram', counts: [[4, 9]], lump: null }],
    ['a shot list', { kind: 'shots', shots: [3, 1, 4, 1, 5], batches: null }],
    ['batches', { kind: 'shots', shots: [3, 1, 4], batches: ['x, "y"', 'b', '7'] }]
  ])('%s is read back as it was', (_name, data) => {
    const read = readCounts(textOfData(data));
    if (!read.ok) throw new Error(read.problems.map(({ message }) => message).join());
    const back = read.datasets[0].data;
    expect(back.kind === 'shots' ? { ...back, shots: Array.from(back.shots) } : back).toEqual(data);
  });
  it('is summed up for a glance', () => {
    expect(
      summaryOfData({
        kind: 'histogram',
        counts: [
          [0, 0],
          [2, 5]
        ],
        lump: { from: 9, shots: 4 }
      })
    ).toEqual({ shots: 9, distinct: 2, smallest: 2, largest: 9, open: true, opening: false, batches: null });
    expect(summaryOfData({ kind: 'shots', shots: [3, 1, 3], batches: ['a', 'a', 'b'] })).toEqual({
      shots: 3,
      distinct: 2,
      smallest: 1,
      largest: 3,
      open: false,
      opening: false,
      batches: 2
    });
  });
  it('of a file over the limit is refused with its size', () => {
    const refused = tooLarge(50 * 1024 * 1024);
    expect(refused.ok ? '' : refused.problems[0].message).toBe('The file has 50 MB; the limit is 20 MB.');
  });
});

describe('timeLeft', () => {
  it('goes by the share done', () => expect(timeLeft(3, 0.25)).toBe(9));
  it('says nothing in the first second or with next to nothing done', () => {
    expect(timeLeft(0.9, 0.5)).toBeNull();
    expect(timeLeft(20, 0.01)).toBeNull();
  });
});
