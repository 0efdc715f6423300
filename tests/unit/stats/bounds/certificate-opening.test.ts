import { certificate, type CertificateInput } from '$lib/stats/bounds/certificate';
import { clopperPearson } from '$lib/stats/numerics/clopper-pearson';
import { logBinomialTail } from '$lib/stats/numerics/log-binomial-tail';
import { poissonInterval } from '$lib/stats/numerics/poisson-interval';
import { describe, expect, it } from 'vitest';

const N = 20;

/** Counts n for N − n: sites without a defect for sites with one, an opening row for a closing one. */
const mirrored = ({ counts, lump, below, ...rest }: CertificateInput): CertificateInput => ({
  ...rest,
  counts: counts.map(([n, h]): [number, number] => [N - n, h]).reverse(),
  lump: below ? { from: N - below.to, shots: below.shots } : null,
  below: lump ? { to: N - lump.from, shots: lump.shots } : null
});

const table: [number, number][] = [
  [4, 500],
  [5, 300],
  [9, 60],
  [12, 14]
];

describe('a certificate of counts with an opening row', () => {
  it.each<[string, CertificateInput]>([
    ['an opening row', { counts: table, lump: null, below: { to: 3, shots: 126 }, shots: 1000, trials: N }],
    [
      'rows at both ends',
      { counts: table, lump: { from: 13, shots: 6 }, below: { to: 2, shots: 120 }, shots: 1000, trials: N }
    ]
  ])('is the mirror image of one with a closing row: %s', (_, input) => {
    const [one, two] = [certificate(input)!, certificate(mirrored(input))!];
    expect(two.p).toBeCloseTo(one.p, 12);
    expect(two.thresholds).toBe(one.thresholds);
    expect(two.count).toBe(N - one.count);
    expect(two.side).not.toBe(one.side);
    expect(two.mean).toBeCloseTo(N - one.mean, 10);
    expect(two.shots).toBe(one.shots);
  });

  it('takes its shots at their worst: as empty for the lower end, as its largest count for the upper', () => {
    const counts: [number, number][] = [
      [8, 300],
      [9, 400],
      [10, 270]
    ];
    const shots = 1000;
    const found = certificate({ counts, lump: null, below: { to: 2, shots: 30 }, shots, trials: 12 })!;
    const listed = 8 * 300 + 9 * 400 + 10 * 270;
    const lower = clopperPearson(listed, 12 * shots, 1 - 1e-6).low;
    expect(found).toMatchObject({ side: 'low', count: 2, shots: 30 });
    expect(found.mean).toBeCloseTo(12 * lower, 10);
    // Low: from the whole count at or below μ_L − 1 down to the row's 2. High: from μ_U + 1, with 2 for each of the 30.
    const upper = clopperPearson(listed + 2 * 30, 12 * shots, 1 - 1e-6).high;
    const low = Math.floor(12 * lower - 1) - 2 + 1;
    const high = 12 - Math.ceil(12 * upper + 1) + 1;
    expect(found.thresholds).toBe(low + high);
    const bound = logBinomialTail('low', 2, 12, lower);
    const p = Math.exp(Math.log(low + high) + logBinomialTail('high', 30, shots, Math.exp(bound))) + 1e-6;
    expect(found.p).toBeCloseTo(p, 12);
    expect(found.p).toBeLessThan(2e-6);
  });

  it('with N unknown has both sides, and no threshold inside the row', () => {
    const counts: [number, number][] = [
      [4, 200],
      [5, 300],
      [6, 200],
      [19, 30]
    ];
    const shots = 1000;
    const found = certificate({ counts, lump: null, below: { to: 3, shots: 270 }, shots, trials: null })!;
    const listed = 800 + 1500 + 1200 + 570;
    expect(found).toMatchObject({ side: 'high', count: 19, shots: 30 });
    expect(found.mean).toBeCloseTo(poissonInterval(listed + 3 * 270, 1 - 1e-6).high / shots, 10);
    // The mean may be as low as 3.9 with the row's shots empty: 2 and below lie inside the row.
    expect(poissonInterval(listed, 1 - 1e-6).low / shots - 1).toBeLessThan(3);
    const alone = certificate({ counts, lump: null, below: { to: 3, shots: 270 }, shots, trials: 5000 })!;
    expect(alone.thresholds).toBe(found.thresholds);
  });

  // Whatever counts the row hides, the certificate of the whole table is about as strong or stronger.
  it('is never stronger than that of the counts it may hide, threshold by threshold', () => {
    const counts: [number, number][] = [
      [6, 400],
      [7, 350],
      [14, 50]
    ];
    const lumped = certificate({ counts, lump: null, below: { to: 3, shots: 200 }, shots: 1000, trials: N })!;
    for (const hidden of [0, 1, 2, 3]) {
      const whole = certificate({ counts: [[hidden, 200], ...counts], lump: null, shots: 1000, trials: N })!;
      expect(lumped.p / lumped.thresholds, `${hidden}`).toBeGreaterThanOrEqual(
        (whole.p - 1e-6) / whole.thresholds
      );
    }
  });
});
