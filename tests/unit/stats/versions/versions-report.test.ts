import { binomialWindow } from '$lib/stats/laws/binomial-window';
import { generator, type Generator } from '$lib/stats/random/generator';
import { histogramSampler } from '$lib/stats/random/histogram-sampler';
import { BadInput } from '$lib/stats/types';
import type { VersionCell } from '$lib/stats/versions/types';
import { versionsReport } from '$lib/stats/versions/versions-report';
import { describe, expect, it } from 'vitest';

const samplers = new Map<number, (random: Generator, shots: number) => [number, number][]>();

/** Counts of 64 equal trials with a mean of `mean` in all. */
function equal(mean: number) {
  const known = samplers.get(mean);
  if (known) return known;
  const { first, values } = binomialWindow(64, mean / 64, 1e-18, 1);
  const sampler = histogramSampler(values);
  const into = new Float64Array(values.length);
  const draw = (random: Generator, shots: number) => {
    sampler.draw(random, shots, into);
    return Array.from(into, (h, i): [number, number] => [first + i, h]).filter(([, h]) => h > 0);
  };
  samplers.set(mean, draw);
  return draw;
}

const cell = (group: string, version: string, counts: [number, number][]): VersionCell => ({
  group,
  version,
  label: `${group} ${version}`,
  histogram: { kind: 'histogram', counts, lump: null },
  trials: 64,
  unit: 'defect',
  geometry: 'sites'
});

const asked = { versions: ['1', '2'], reference: '1', alpha: 0.05, tolerance: 0.1, pairs: null };

describe('versionsReport', () => {
  it('gives mean and variance over ceiling of a small case by hand', async () => {
    // 0 ×1, 1 ×2, 2 ×1 of N = 4: mean 1, unbiased variance 2/3, ceiling 1·(1 − 1/4) = 3/4.
    const counts: [number, number][] = [[0, 1], [1, 2], [2, 1]]; // prettier-ignore
    const { cells } = await versionsReport([{ ...cell('a', '1', counts), trials: 4 }], asked);
    expect(cells[0]).toMatchObject({ shots: 4, mark: 'reference', limits: null, mean: { value: 1 } });
    expect(cells[0].dispersion!.value).toBeCloseTo(8 / 9, 12);
  });

  it.each([
    [3, 500, 2000],
    [12, 5000, 500],
    [6, 2000, 2000]
  ])(
    'keeps 99.73 per cent of equal versions within its limits, at mean %d, %i and %i shots',
    async (mean, shots0, shots) => {
      let [mean0, dispersion] = [0, 0];
      const runs = 3000;
      for (let run = 0; run < runs; run++) {
        const random = generator(61, run);
        const pair = [
          cell('a', '1', equal(mean)(random, shots0)),
          cell('a', '2', equal(mean)(random, shots))
        ];
        const { limits, mean: m, dispersion: d } = (await versionsReport(pair, asked)).cells[1];
        if (m!.value < limits!.mean![0] || m!.value > limits!.mean![1]) mean0++;
        if (d!.value < limits!.dispersion[0] || d!.value > limits!.dispersion[1]) dispersion++;
      }
      // 0.27 % of 3000 is 8.1 with a standard deviation of 2.8.
      for (const out of [mean0, dispersion]) expect(out).toBeLessThanOrEqual(18);
      expect(mean0 + dispersion).toBeGreaterThan(3);
    }
  );

  it('marks what rose, what differs otherwise, and what cannot tell', async () => {
    const random = generator(62, 0);
    const mixed = [...equal(4)(random, 2500), ...equal(8)(random, 2500)];
    const counts = new Map<number, number>();
    for (const [count, shots] of mixed) counts.set(count, (counts.get(count) ?? 0) + shots);
    const risen = [...counts].sort((a, b) => a[0] - b[0]);
    const cells = [
      ...['a', 'b', 'c', 'd'].map((group) => cell(group, '1', equal(6)(random, 8000))),
      cell('a', '2', equal(6)(random, 8000)),
      cell('b', '2', risen),
      cell('c', '2', equal(8)(random, 8000)),
      cell('d', '2', equal(6)(random, 100)),
      cell('e', '2', equal(6)(random, 8000))
    ];
    const pairs = { groups: ['a', 'b'], versions: ['1', '2'], seed: 1 };
    const report = await versionsReport(cells, { ...asked, pairs });
    const marks = report.cells
      .filter(({ version }) => version === '2')
      .map(({ group, mark }) => [group, mark]);
    expect(Object.fromEntries(marks)).toEqual({
      a: 'no-difference-seen',
      b: 'risen',
      c: 'differs',
      d: 'cannot-tell',
      e: 'cannot-tell'
    });
    expect(report.statement).toContain('2 (1 group)');
    expect(report.cells.find(({ group }) => group === 'e')!.hindrances).toEqual(['no-reference']);
    expect(report.pairs).toMatchObject({ canReachAlpha: true });
    expect(report.pairs!.tests.map(({ pAdjusted }) => pAdjusted <= 0.05)).toEqual([false, true]);
    expect(JSON.parse(JSON.stringify(report))).toEqual(report);
  });

  it('says how many cells could see a rise, and never that nothing rose where nearly all are blind', async () => {
    const random = generator(67, 0);
    const cells = ['a', 'b', 'c', 'd'].flatMap((group) => {
      const shots = group === 'a' ? 20_000 : 100;
      return ['1', '2'].map((version) => cell(group, version, equal(6)(random, shots)));
    });
    const report = await versionsReport(cells, asked);
    expect(report.statement).toBe('No rise over version 1 is seen in 1 of 4 cells; 3 cannot tell.');
    const blind = await versionsReport(cells.slice(2), asked);
    expect(blind.statement).toBe('Nothing can be told of a rise over version 1.');
    // Another mean, in too few shots to see a rise of the tolerance.
    const moved = await versionsReport(
      [
        cell('a', '1', equal(6)(random, 20_000)),
        cell('a', '2', equal(6)(random, 20_000)),
        cell('b', '1', equal(3)(random, 200)),
        cell('b', '2', equal(12)(random, 200))
      ],
      asked
    );
    expect(moved.statement).toContain('1 of 2 cells; 1 cannot tell');
    expect(moved.because.join(' ')).toContain('In 1 of them a rise of 10');
  });

  it('says over how many cells it adjusts, and that a gate, which takes one version, may see more', async () => {
    const random = generator(70, 0);
    const versions = ['1', '2', '3', '4'];
    const cells = versions.map((version) => cell('a', version, equal(6)(random, 500)));
    const cautions = async (named: string[]) =>
      (await versionsReport(cells.slice(0, named.length), { ...asked, versions: named })).cautions.join(' ');
    // Three cells here, two tests at the gate of one version; then two cells.
    expect(await cautions(versions)).toMatch(
      /over 3 cells of all versions .* less is seen here than at the gate/
    );
    expect(await cautions(versions.slice(0, 3))).toMatch(/over 2 cells .* or the other way round/);
    // Told once, and nothing of an adjustment where one cell is compared.
    expect((await cautions(versions)).match(/adjusted/g)).toHaveLength(1);
    expect(await cautions(versions.slice(0, 2))).not.toMatch(/adjusted/);
  });

  it('shuffles no pair of other trials, geometry or cut, and counts those left out', async () => {
    const counts = equal(6)(generator(68, 0), 5000);
    const one = (version: string, more: Partial<VersionCell>): VersionCell => ({
      ...cell('a', version, counts),
      ...more
    });
    const cells = [
      one('1', {}),
      one('2', {}),
      one('3', { trials: 40 }),
      one('4', { geometry: 'ring-bonds' }),
      one('5', {
        kept: { from: 2, to: 9 },
        histogram: { kind: 'histogram', lump: null, counts: counts.filter(([n]) => n >= 2 && n <= 9) }
      })
    ];
    const versions = ['1', '2', '3', '4', '5'];
    const pairs = { groups: ['a'], versions, seed: 1 };
    const report = await versionsReport(cells, { ...asked, versions, reference: null, pairs });
    expect(report.pairs!.tests.map(({ first, second }) => first + second)).toEqual(['12']);
    expect(report.pairs!.leftOut).toBe(9);
    expect(report.because.join(' ')).toMatch(
      /^No difference of the two versions is seen.* 9 pairs were not compared/
    );
  });

  it('compares no means where the number of trials is another, and scatter all the same', async () => {
    const random = generator(69, 0);
    const other = binomialWindow(32, 6 / 64, 1e-18, 1);
    const into = new Float64Array(other.values.length);
    histogramSampler(other.values).draw(random, 5000, into);
    const half = Array.from(into, (h, i): [number, number] => [other.first + i, h]).filter(([, h]) => h > 0);
    const report = await versionsReport(
      [cell('a', '1', equal(6)(random, 5000)), { ...cell('a', '2', half), trials: 32 }],
      asked
    );
    expect(report.cells[1]).toMatchObject({ mark: 'no-difference-seen', limits: { mean: null } });
    expect(report.cells[1].limits!.dispersion[0]).toBeLessThan(1);
  });

  it('refuses versions that are not listed, doubled cells, and a reference that is none', async () => {
    const one = cell('a', '1', [[0, 5], [1, 5]]); // prettier-ignore
    await expect(versionsReport([{ ...one, version: '9' }], asked)).rejects.toThrow(BadInput);
    await expect(versionsReport([one, one], asked)).rejects.toThrow(BadInput);
    await expect(versionsReport([one], { ...asked, reference: '9' })).rejects.toThrow(BadInput);
    await expect(versionsReport([one], { ...asked, versions: ['1', '1'] })).rejects.toThrow(BadInput);
  });
});
