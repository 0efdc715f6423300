import { defaultOptions } from '$lib/stats/default-options';
import { diagnose } from '$lib/stats/diagnose';
import { BadInput, type CountData, type DiagnoseOptions, type Diagnosis } from '$lib/stats/types';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';

/** What a person, or a broken script, might send. Astronomic numbers of shots with counts of ordinary reach. */
const size = fc.oneof(fc.integer({ min: 1, max: 9 }), fc.integer({ min: 1, max: 5000 }));
const rows = fc.oneof(
  { weight: 4, arbitrary: fc.array(fc.tuple(fc.oneof(fc.nat(3), fc.nat(25)), size), { maxLength: 9 }) },
  { weight: 1, arbitrary: fc.array(fc.tuple(fc.nat(300), size), { maxLength: 9 }) },
  {
    weight: 1,
    arbitrary: fc.array(fc.tuple(fc.nat(12), fc.integer({ min: 1, max: 2 ** 40 })), { maxLength: 9 })
  }
);
const lump = fc.option(fc.record({ from: fc.integer({ min: 1, max: 40 }), shots: size }), { freq: 4 });
const histogram = fc.record({ kind: fc.constant('histogram' as const), counts: rows, lump });
const list = fc.array(fc.nat(8), { minLength: 0, maxLength: 60 }).chain((shots) =>
  fc.record({
    kind: fc.constant('shots' as const),
    shots: fc.constant(shots),
    batches: fc.option(fc.constant(shots.map((_, i) => `run ${i % 3}`)))
  })
);
const anyData: fc.Arbitrary<CountData> = fc.oneof(
  { weight: 4, arbitrary: histogram },
  { weight: 1, arbitrary: list }
);
const anyOptions = fc
  .record({
    trials: fc.oneof(
      fc.constant(null),
      fc.integer({ min: 1, max: 60 }),
      fc.nat(400),
      fc.constantFrom(0, 1, 2, 1e6, 1e9)
    ),
    unit: fc.oneof({ weight: 5, arbitrary: fc.constant('defect' as const) }, fc.constant('pair' as const)),
    alpha: fc.constantFrom(0.01, 0.05, 1e-6),
    tolerance: fc.constantFrom(0.1, 0.02, 2),
    seed: fc.nat(1000),
    misread: fc.constantFrom(null, 0, 0.01, 0.3),
    geometry: fc.constantFrom('sites' as const, 'open-bonds' as const, 'ring-bonds' as const)
  })
  .map((changed): DiagnoseOptions => ({ ...defaultOptions, ...changed, resamples: 19 }));

/** Paths of all numbers that are no finite numbers, and of holes. */
function spoilt(value: unknown, path = 'document'): string[] {
  if (typeof value === 'number') return Number.isFinite(value) ? [] : [`${path} = ${value}`];
  if (value === undefined) return [`${path} is undefined`];
  if (value === null || typeof value !== 'object') return [];
  return Object.entries(value).flatMap(([key, inner]) => spoilt(inner, `${path}.${key}`));
}

function ordered({
  low,
  value,
  high
}: {
  low: number | null;
  value: number | null;
  high: number | null;
}): boolean {
  const at = value ?? 0;
  return (low === null || low <= at) && (high === null || high >= at);
}

function hold(found: Diagnosis): void {
  expect(spoilt(found)).toEqual([]);
  expect(JSON.parse(JSON.stringify(found))).toEqual(found);
  for (const { id, p, pAdjusted, smallestP, resamples } of found.tests) {
    expect(p >= 0 && p <= 1 && pAdjusted >= p && pAdjusted <= 1, id).toBe(true);
    if (resamples > 0) expect(p, id).toBeGreaterThanOrEqual(smallestP * (1 - 1e-12));
  }
  const { ceiling, criticalTrials, pairCovariance, ...intervals } = found.moments;
  expect(ceiling).toBeGreaterThanOrEqual(0);
  for (const [name, interval] of Object.entries(intervals)) expect(ordered(interval), name).toBe(true);
  expect(criticalTrials === null || criticalTrials > 0).toBe(true);
  expect(pairCovariance === null || Number.isFinite(pairCovariance)).toBe(true);
  expect(found.fit.floor).toBeLessThanOrEqual(found.fit.divergence);
  expect(ordered(found.fit.divergenceInterval)).toBe(true);
  expect(found.fit.levels.every(({ p, trials }) => p >= 0 && p <= 1 && trials >= 1)).toBe(true);
  let observed = 0;
  for (const row of found.distribution) {
    observed += row.observed;
    expect(row.low <= row.observed && row.observed <= row.high).toBe(true);
    expect(row.fitted >= 0 && row.fitted <= 1).toBe(true);
  }
  expect(observed).toBeCloseTo(1, 9);
  for (const { empirical, low, high } of found.rate.points) {
    if (empirical !== null) expect(low <= empirical && (high === null || high >= empirical)).toBe(true);
    expect(low).toBeGreaterThanOrEqual(0);
  }
  for (const row of found.tails.points) {
    expect(row.fitted).toBeLessThanOrEqual(row.chernoff * (1 + 1e-9) + 1e-300);
    expect(row.chernoff).toBeLessThanOrEqual(row.meanChernoff * (1 + 1e-9) + 1e-300);
  }
  const words = JSON.stringify([found.answer, found.flags, found.cautions, found.notRun, found.fit.how]);
  expect(words).not.toMatch(/prove[sdn]?\b|\b(is|are) independent\b|NaN|undefined|Infinity/i);
  expect(found.answer.statement).toMatch(/^(These|Every|One|No|Independent trials cannot)/);
}

describe('diagnose', () => {
  it('gives a whole and finite document, or refuses in words, whatever it is fed', async () => {
    let diagnosed = 0;
    await fc.assert(
      fc.asyncProperty(anyData, anyOptions, async (data, options) => {
        let found: Diagnosis;
        try {
          found = await diagnose(data, options);
        } catch (error) {
          expect(error).toBeInstanceOf(BadInput);
          expect((error as BadInput).reason.length).toBeGreaterThan(10);
          return;
        }
        diagnosed++;
        hold(found);
      }),
      // As many as half a minute allows.
      { seed: 20261201, numRuns: 150, interruptAfterTimeLimit: 30_000, markInterruptAsFailure: false }
    );
    expect(diagnosed).toBeGreaterThan(5);
  }, 90_000);

  it('is the same, byte for byte, for a shot list in another order but for the tests of order', async () => {
    const shots = [0, 1, 2, 1, 3, 0, 2, 1, 1, 4, 2, 0, 1, 5, 2, 1];
    const options = { ...defaultOptions, trials: 9, resamples: 99 };
    const one = await diagnose({ kind: 'shots', shots, batches: null }, options);
    const other = await diagnose({ kind: 'shots', shots: shots.toReversed(), batches: null }, options);
    expect(other.data).toEqual(one.data);
    expect(other.fit).toEqual(one.fit);
    expect(other.moments).toEqual(one.moments);
    const statistics = ({ tests }: Diagnosis) =>
      tests.filter(({ id }) => id !== 'order').map(({ id, statistic, p }) => [id, statistic, p]);
    expect(statistics(other)).toEqual(statistics(one));
  });

  it('does not change what it is given', async () => {
    const data: CountData = {
      kind: 'histogram',
      counts: [
        [3, 5],
        [0, 2],
        [1, 9]
      ],
      lump: { from: 5, shots: 1 }
    };
    const before = JSON.stringify(data);
    await diagnose(data, { ...defaultOptions, resamples: 19, trials: 12 });
    expect(JSON.stringify(data)).toBe(before);
  });
});
