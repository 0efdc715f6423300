import { cumulantsPlace } from '$lib/charts/cumulants-place';
import { cumulantsTitle } from '$lib/charts/cumulants-title';
import { flagRows, testRows } from '$lib/charts/forest-rows';
import type { Point, Reading } from '$lib/charts/picture';
import { regionPicture } from '$lib/charts/region-picture';
import { stepOfKey } from '$lib/charts/reading/step-of-key';
import { thinnedLine } from '$lib/charts/thinned-line';
import { TESTS } from '$lib/model/labels';
import { describe, expect, it } from 'vitest';
import { anyDiagnosis, WELDON } from './any-diagnosis';

/** Greenwood and Yule 1920, JRSS 83:255: accidents of 647 workers. */
const ACCIDENTS: [number, number][] = [447, 132, 42, 21, 3, 2].map((shots, count) => [count, shots]);

describe('keys of a chart', () => {
  const readings = (number: number) =>
    Array.from({ length: number }, (): Reading => ({ x: 0, y: 0, words: () => '' }));
  it('go on to the right, and down where readings stand under one another', () => {
    const across = { readings: readings(5), order: 'across' } as const;
    const down = { readings: readings(5), order: 'down' } as const;
    const steps = (picture: typeof across | typeof down) =>
      ['ArrowRight', 'ArrowUp', 'ArrowLeft', 'ArrowDown', 'Home', 'End', 'a'].map((key) =>
        stepOfKey(key, picture)
      );
    expect(steps(across)).toEqual([1, 1, -1, -1, -Infinity, Infinity, null]);
    expect(steps(down)).toEqual([1, -1, -1, 1, -Infinity, Infinity, null]);
  });
  it('page by ten, and by a twentieth of many', () => {
    expect(stepOfKey('PageUp', { readings: readings(30), order: 'across' })).toBe(10);
    expect(stepOfKey('PageDown', { readings: readings(10_000), order: 'across' })).toBe(-500);
  });
});

describe('thinnedLine', () => {
  it('keeps ends, order, the highest and the lowest, and few points', () => {
    const line = Array.from({ length: 20_000 }, (_, i): Point => [i / 40, Math.cos(i / 900) * 100 + (i % 7)]);
    const kept = thinnedLine(line);
    expect(kept.length).toBeLessThanOrEqual(4 * 3 * 500 + 4);
    expect(kept[0]).toBe(line[0]);
    expect(kept[kept.length - 1]).toBe(line[line.length - 1]);
    const xs = kept.map(([x]) => x);
    expect(xs).toEqual([...xs].sort((a, b) => a - b));
    const ys = (points: Point[]) => points.map(([, y]) => y);
    expect(Math.max(...ys(kept))).toBe(Math.max(...ys(line)));
    expect(Math.min(...ys(kept))).toBe(Math.min(...ys(line)));
  });
  it('leaves a short line alone', () => {
    const line: Point[] = [
      [0, 1],
      [0.1, 2],
      [0.2, 3]
    ];
    expect(thinnedLine(line)).toBe(line);
  });
});

describe('the counts in the plane of cumulants', () => {
  it('dice lie where trials reach, accidents beyond', async () => {
    const dice = cumulantsPlace(await anyDiagnosis(WELDON, { trials: 12 }));
    const accidents = cumulantsPlace(await anyDiagnosis(ACCIDENTS, { resamples: 499 }));
    if ('reason' in dice || 'reason' in accidents) throw new Error('both have cumulants');
    // Variance over mean 1.487241 (Greenwood and Yule's counts, R 4.2).
    expect(accidents.fano.value).toBeCloseTo(1.487241, 6);
    expect(dice.share).toBeCloseTo(0.3376986, 6);
    expect(['inside', 'near']).toContain(dice.standing);
    expect(accidents.standing).toBe('more');
    expect(cumulantsTitle(accidents)).toMatch(/beyond what any independent trials/);
    const { marks, readings } = regionPicture(dice, { width: 760, text: 13 });
    expect(marks.some((mark) => mark.kind === 'path' && mark.role === 'hatch' && mark.d !== '')).toBe(true);
    expect(readings.map(({ words }) => words()).join()).toMatch(/Seen: κ₂\/κ₁ 0\.666/);
  });
  it.each([
    [
      'a lump',
      () => anyDiagnosis(WELDON.slice(0, 10), { trials: 12 }, { from: 10, shots: 18 }),
      /lumps counts/
    ],
    ['one shot', () => anyDiagnosis([[3, 1]], { trials: 12 }), /Too few shots/],
    ['no spread', () => anyDiagnosis([[3, 700]], { trials: 12 }), /same count/],
    ['empty shots', () => anyDiagnosis([[0, 40]], { trials: 5 }), /No shot has a defect/]
  ])('%s has no place, and says why', async (_name, make, why) => {
    const place = cumulantsPlace(await make());
    expect('reason' in place ? place.reason : '').toMatch(why);
  });
});

describe('lines of the tests chart', () => {
  it('hold every test, the certificate and every flag with its grade and size', async () => {
    const diagnosis = await anyDiagnosis(ACCIDENTS, { resamples: 499 });
    expect(diagnosis.flags.map(({ id }) => id)).toContain('bunching');
    const tests = testRows(diagnosis, TESTS);
    expect(tests.map(({ label }) => label)).toEqual([
      ...diagnosis.tests.map(({ id }) => TESTS[id]),
      ...(diagnosis.tails.certificate ? ['exact certificate'] : [])
    ]);
    const flags = flagRows(diagnosis, TESTS);
    expect(flags).toHaveLength(diagnosis.flags.length);
    const bunching = flags[diagnosis.flags.findIndex(({ id }) => id === 'bunching')];
    const ceiling = diagnosis.tests.find(({ id }) => id === 'ceiling')!;
    expect(bunching).toMatchObject({ label: 'Bunching shown', kind: 'more', at: ceiling.pAdjusted });
    expect(bunching.words()).toMatch(/^Bunching shown, by variance over the ceiling.*times the ceiling/);
  });
});
