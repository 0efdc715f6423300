import { certificate, type CertificateInput } from '$lib/stats/bounds/certificate';
import { clopperPearson } from '$lib/stats/numerics/clopper-pearson';
import { logBinomialTail } from '$lib/stats/numerics/log-binomial-tail';
import { logPoissonTail } from '$lib/stats/numerics/log-poisson-tail';
import { poissonInterval } from '$lib/stats/numerics/poisson-interval';
import { describe, expect, it } from 'vitest';

/** The definition word for word, threshold by threshold, without a lump (second algorithm). */
function byDefinition({ counts, shots, trials }: CertificateInput) {
  const total = counts.reduce((sum, [n, h]) => sum + n * h, 0);
  const level = 1 - 1e-6;
  const poisson = poissonInterval(total, level);
  const binomial = trials === null ? null : clopperPearson(total, shots * trials, level);
  const upper = binomial && trials ? trials * binomial.high : poisson.high / shots;
  const lower = binomial && trials ? trials * binomial.low : poisson.low / shots;
  const bound = (side: 'high' | 'low', n: number, mean: number) =>
    trials === null ? logPoissonTail(side, n, mean) : logBinomialTail(side, n, trials, mean / trials);
  const found: { side: string; n: number; p: number }[] = [];
  for (let n = Math.ceil(upper + 1); n <= (trials ?? Infinity); n++) {
    const b = Math.exp(bound('high', n, upper));
    const tail = counts.reduce((sum, [c, h]) => (c >= n ? sum + h : sum), 0);
    found.push({ side: 'high', n, p: Math.exp(logBinomialTail('high', tail, shots, b)) });
    if (shots * b < 1e-9) break;
  }
  for (let n = Math.floor(lower - 1); n >= 0; n--) {
    const b = Math.exp(bound('low', n, lower));
    const tail = counts.reduce((sum, [c, h]) => (c <= n ? sum + h : sum), 0);
    found.push({ side: 'low', n, p: Math.exp(logBinomialTail('high', tail, shots, b)) });
    if (shots * b < 1e-9) break;
  }
  if (found.length === 0) return null;
  const best = found.reduce((a, b) => (b.p < a.p ? b : a));
  return { ...best, thresholds: found.length, p: Math.min(1, found.length * best.p + 1e-6) };
}

const yeast: [number, number][] = [
  [0, 213],
  [1, 128],
  [2, 37],
  [3, 18],
  [4, 3],
  [5, 1]
];
const accidents: [number, number][] = [
  [0, 447],
  [1, 132],
  [2, 42],
  [3, 21],
  [4, 3],
  [5, 2]
];

describe('certificate', () => {
  it.each<[string, CertificateInput]>([
    // Student 1907, Biometrika 5:351, square A; Greenwood & Yule 1920, JRSS 83:255.
    ['yeast', { counts: yeast, lump: null, shots: 400, trials: null }],
    ['accidents', { counts: accidents, lump: null, shots: 647, trials: null }],
    ['accidents of 40 at most', { counts: accidents, lump: null, shots: 647, trials: 40 }],
    [
      'a wide law',
      {
        counts: [
          [0, 30],
          [5, 900],
          [12, 70]
        ],
        lump: null,
        shots: 1000,
        trials: 20
      }
    ],
    ['an empty device', { counts: [[0, 500]], lump: null, shots: 500, trials: 10 }],
    [
      'nearly full',
      {
        counts: [
          [10, 3],
          [15, 20],
          [16, 477]
        ],
        lump: null,
        shots: 500,
        trials: 16
      }
    ],
    ['one shot', { counts: [[7, 1]], lump: null, shots: 1, trials: 64 }]
  ])('is what the definition says: %s', (_, input) => {
    const want = byDefinition(input);
    const got = certificate(input);
    expect(got?.p).toBeCloseTo(want?.p ?? NaN, 11);
    expect(got?.thresholds).toBe(want?.thresholds);
    if (want && want.p < 1) expect([got?.side, got?.count]).toEqual([want.side, want.n]);
  });

  it('is the mirror image when defects and empty sites change places', () => {
    const counts: [number, number][] = [
      [2, 10],
      [4, 500],
      [5, 300],
      [9, 60],
      [12, 4]
    ];
    const mirrored = counts.map(([n, h]) => [20 - n, h] as [number, number]).reverse();
    const one = certificate({ counts, lump: null, shots: 874, trials: 20 });
    const two = certificate({ counts: mirrored, lump: null, shots: 874, trials: 20 });
    expect(two?.side).toBe('low');
    expect(two?.count).toBe(20 - (one?.count ?? NaN));
    expect(two?.p).toBe(one?.p);
    expect(two?.mean).toBeCloseTo(20 - (one?.mean ?? NaN), 12);
  });

  it('rules out too many empty shots from below, N known or not', () => {
    const counts: [number, number][] = [
      [0, 100],
      [7, 300],
      [8, 300],
      [9, 300]
    ];
    for (const trials of [40, null]) {
      const found = certificate({ counts, lump: null, shots: 1000, trials });
      expect(found).toMatchObject({ side: 'low', count: 0, shots: 100 });
      expect(found?.p).toBeLessThan(1.001e-6);
    }
  });

  it('takes a lump at its worst', () => {
    const counts: [number, number][] = [
      [0, 300],
      [1, 397],
      [2, 215],
      [3, 60],
      [4, 20]
    ];
    const lump = { from: 6, shots: 8 };
    const shots = 1000;
    const found = certificate({ counts, lump, shots, trials: 12 });
    // 1087 defects are listed, and the 8 shots may hold 12 each.
    const upper = clopperPearson(1087 + 8 * 12, 12_000, 1 - 1e-6).high;
    expect(found).toMatchObject({
      side: 'high',
      count: 6,
      shots: 8,
      thresholds: 7 - Math.ceil(12 * upper + 1)
    });
    expect(found?.mean).toBeCloseTo(12 * upper, 12);
    const tail = logBinomialTail('high', 8, shots, Math.exp(logBinomialTail('high', 6, 12, upper)));
    const thresholds = found?.thresholds ?? NaN;
    expect(Math.log((found?.p ?? NaN) - 1e-6)).toBeCloseTo(Math.log(thresholds) + tail, 6);
    expect(found?.p).toBeGreaterThan(2e-6);
    expect(found?.p).toBeLessThan(1e-3);
    // N unknown: no upper end, so the low side alone.
    const unknown = certificate({
      counts: [
        [0, 90],
        [8, 900]
      ],
      lump: { from: 9, shots: 10 },
      shots,
      trials: null
    });
    expect(unknown?.side).toBe('low');
    const lower = poissonInterval(7200 + 90, 1 - 1e-6).low / shots;
    expect(unknown?.mean).toBeCloseTo(lower, 12);
    expect(unknown?.thresholds).toBeLessThanOrEqual(Math.floor(lower - 1) + 1);
    expect(certificate({ counts: [[0, 990]], lump: { from: 1, shots: 10 }, shots, trials: null })).toBeNull();
  });

  it('holds beyond S·N = 2^53', () => {
    // Scaling shots by 2^43 leaves the mean; the interval shrinks onto it, and p falls to its floor.
    const scale = 2 ** 43;
    const counts: [number, number][] = [
      [0, 400 * scale],
      [1, 500 * scale],
      [5, 124 * scale]
    ];
    const found = certificate({ counts, lump: null, shots: 2 ** 53, trials: 1000 });
    expect(found?.p).toBeCloseTo(1e-6, 15);
    const mean = (500 + 620) / 1024;
    // 4.9 standard errors of the mean, z for β/2 = 5e-7 (R 4.2: qnorm(1 - 5e-7) = 4.891638).
    const width = 4.891638 * Math.sqrt((mean * (1 - mean / 1000)) / 2 ** 53);
    expect((found?.mean ?? NaN) - mean).toBeGreaterThan(width * 0.999);
    expect((found?.mean ?? NaN) - mean).toBeLessThan(width * 1.001);
  });

  it('says when there is nothing to try', () => {
    expect(certificate({ counts: [[0, 5]], lump: null, shots: 5, trials: 0 })).toBeNull();
    expect(
      certificate({
        counts: [
          [0, 5],
          [1, 5]
        ],
        lump: null,
        shots: 10,
        trials: 1
      })
    ).toBeNull();
  });
});
