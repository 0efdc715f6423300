import { driftReport } from '$lib/stats/drift/drift-report';
import { neighbourSums } from '$lib/stats/drift/neighbour-sums';
import { defaultOptions } from '$lib/stats/default-options';
import { diagnose } from '$lib/stats/diagnose';
import { betaSample } from '$lib/stats/random/beta-sample';
import { binomialSample } from '$lib/stats/random/binomial-sample';
import { generator } from '$lib/stats/random/generator';
import { equalWindow } from '$lib/stats/resampling/ceiling-test';
import { unbroken } from '$lib/stats/resampling/pace';
import { describe, expect, it } from 'vitest';

const TRIALS = 100;
const REPEATS = 200;

/** 10 batches of 200 shots of 100 bonds; p rises by `ramp` through every batch, ρ ties the bonds of a shot. */
function made(seed: number, { ramp, rho }: { ramp: number; rho: number }) {
  const random = generator(seed, 5);
  const shots: number[] = [];
  const batches: string[] = [];
  for (let b = 0; b < 10; b++)
    for (let i = 0; i < 200; i++) {
      const p = 0.1 + ramp * (i / 199 - 0.5);
      const q = rho === 0 ? p : betaSample(random, p * (1 / rho - 1), (1 - p) * (1 / rho - 1));
      shots.push(binomialSample(random, TRIALS, q));
      batches.push(`run ${b}`);
    }
  return { kind: 'shots' as const, shots, batches };
}

async function splitOf(list: ReturnType<typeof made>) {
  const { shots } = list;
  const mean = shots.reduce((a, b) => a + b, 0) / shots.length;
  const variance = shots.reduce((a, n) => a + (n - mean) ** 2, 0) / (shots.length - 1);
  const { window, ceiling } = equalWindow(TRIALS, mean / TRIALS);
  const interval = (value: number) => ({ value, low: null, high: null });
  const part = await driftReport(
    list,
    TRIALS,
    { mean: interval(mean), variance: interval(variance), ceiling: ceiling(mean) },
    { ceiling: null, mostDispersed: { window, ceiling } },
    { ...defaultOptions, trials: TRIALS, resamples: 19, seed: 1 },
    true,
    unbroken
  );
  return { split: part!.split!, statement: part!.statement };
}

async function share(
  of: { ramp: number; rho: number },
  counts: (found: Awaited<ReturnType<typeof splitOf>>) => boolean
): Promise<number> {
  let hits = 0;
  for (let seed = 0; seed < REPEATS; seed++) if (counts(await splitOf(made(seed + 1, of)))) hits++;
  return hits / REPEATS;
}

/** All orders of a list. */
function orders(list: number[]): number[][] {
  if (list.length < 2) return [list];
  return list.flatMap((one, i) =>
    orders([...list.slice(0, i), ...list.slice(i + 1)]).map((rest) => [one, ...rest])
  );
}

describe('neighbourSums', () => {
  it('has the mean and the variance of every order of the shots within their batches, by brute force', () => {
    const [first, second] = [
      [1, 4, 4, 9, 2],
      [7, 3, 3, 5]
    ];
    const products = (list: number[]) => {
      const mean = list.reduce((a, b) => a + b, 0) / list.length;
      return list.slice(1).reduce((sum, n, i) => sum + (n - mean) * (list[i] - mean), 0);
    };
    const all = orders(first).flatMap((a) => orders(second).map((b) => products(a) + products(b)));
    const mean = all.reduce((a, b) => a + b, 0) / all.length;
    const spread = Math.sqrt(all.reduce((sum, t) => sum + (t - mean) ** 2, 0) / all.length);
    const names = [...first.map(() => 'a'), ...second.map(() => 'b')];
    const found = neighbourSums([...first, ...second], names)!;
    expect(found.score).toBeCloseTo((products(first) + products(second) - mean) / spread, 12);
    // Squares of steps by hand: 9 + 0 + 25 + 49 and 16 + 0 + 4, over twice 7 pairs.
    expect(found.steady).toBeCloseTo(103 / 14, 12);
    expect(found.pairs).toBe(7);
  });

  it('follows the shots of a batch through a list that mixes batches', () => {
    const apart = neighbourSums([1, 2, 5, 9, 8, 8, 3, 1], ['a', 'a', 'a', 'a', 'b', 'b', 'b', 'b']);
    const mixed = neighbourSums([1, 8, 2, 8, 3, 5, 9, 1], ['a', 'b', 'a', 'b', 'b', 'a', 'a', 'b']);
    expect(mixed).toEqual(apart);
    expect(neighbourSums([1, 2, 3, 4], ['a', 'a', 'b', 'b'])).toBeNull();
    expect(neighbourSums([2, 2, 2, 4, 4, 4], ['a', 'a', 'a', 'b', 'b', 'b'])).toBeNull();
  });
});

describe('a rate that moves inside batches', () => {
  // A ramp of 0.06 has a variance of 0.06²/12 = 3e-4, an excess of 99·3e-4/0.09 = 0.33 of the ceiling.
  it('is not told as an excess that survives', async () => {
    expect(await share({ ramp: 0.06, rho: 0 }, ({ split }) => split.pTogether! <= 0.01)).toBe(1);
    // Between neighbours the limits are at 97.5 %: 5 of 200 are called, 16 would be five standard errors.
    expect(await share({ ramp: 0.06, rho: 0 }, ({ split }) => split.verdict === 'excess')).toBeLessThan(0.08);
    const { split, statement } = await splitOf(made(3, { ramp: 0.06, rho: 0 }));
    expect(split.verdict).toBe('undecided');
    // A normal law says nothing of chances under 1e-9, so none is told.
    expect(split.order!.p).toBe(1e-9);
    expect(statement).toMatch(/so large a one would turn up at most once in/);
    expect(statement).toMatch(
      /inside batches too the rate changed, for neighbouring shots resemble each other/
    );
  });

  it('is seen in about 5 % where it did not, whether or not defects come together', async () => {
    for (const rho of [0, 0.003]) {
      const called = await share({ ramp: 0, rho }, ({ split }) => split.order!.moved);
      // 5 % of 200, four standard errors.
      expect(called).toBeLessThanOrEqual(0.112);
      expect(called).toBeGreaterThan(0.01);
    }
  });

  it('does not hide an excess that acts shot by shot', async () => {
    // ρ = 0.003: 1 + 99·0.003 = 1.3 times the ceiling, from neighbour to neighbour too.
    for (const ramp of [0, 0.06])
      expect(await share({ ramp, rho: 0.003 }, ({ split }) => split.verdict === 'excess')).toBeGreaterThan(
        0.95
      );
    const { statement, split } = await splitOf(made(5, { ramp: 0.06, rho: 0.003 }));
    expect(statement).toMatch(
      /the excess survives within batches\..*The rate changed inside batches too, but/
    );
    expect(split.order!.dispersion.low!).toBeGreaterThan(1);
  });

  it('limits of the variance from shot to shot hold the truth in about 95 %', async () => {
    for (const [rho, truth] of [
      [0, 1],
      [0.003, 1.297]
    ]) {
      const held = await share(
        { ramp: 0, rho },
        ({ split: { order } }) => order!.dispersion.low! <= truth && truth <= order!.dispersion.high!
      );
      expect(held).toBeGreaterThan(0.88);
      expect(held).toBeLessThan(1);
    }
  });

  it('is said in the answer', async () => {
    const { answer, flags, nuisances } = await diagnose(made(3, { ramp: 0.06, rho: 0 }), {
      ...defaultOptions,
      trials: TRIALS,
      resamples: 499
    });
    expect(flags.map(({ id }) => id)).toContain('drift');
    expect(answer.statement).toMatch(/But the rate changed while the shots were taken/);
    expect(answer.because).toContain(nuisances!.drift!.statement);
  });
});

describe('a drift that does for everything', () => {
  const steps = (seed: number, rates: number[]) => {
    const random = generator(seed, 6);
    const shots = rates.flatMap((p) => Array.from({ length: 300 }, () => binomialSample(random, TRIALS, p)));
    return { kind: 'shots' as const, shots, batches: shots.map((_, i) => `run ${Math.floor(i / 300)}`) };
  };
  const options = { ...defaultOptions, trials: TRIALS, resamples: 999 };

  it('is told first, and bunching only hinted beside it', async () => {
    const { flags, answer } = await diagnose(
      steps(2, [0.08, 0.1, 0.12, 0.09, 0.11, 0.1, 0.07, 0.13]),
      options
    );
    expect(flags[0]).toMatchObject({ id: 'drift', grade: 'shown' });
    const bunching = flags.find(({ id }) => id === 'bunching')!;
    expect(bunching.grade).toBe('hinted');
    expect(bunching.statement).toMatch(/within batches they do not: the drift does for it/);
    expect(answer.statement).toMatch(/the excess lies between batches\.$/);
  });

  it('is a reservation where the variance keeps its ceiling too', async () => {
    // 20 trials of 100 fire, and drift a little: the ceiling at N = 100 leaves them room.
    const random = generator(4, 6);
    const shots = [0.35, 0.38, 0.4, 0.36, 0.39, 0.37].flatMap((p) =>
      Array.from({ length: 300 }, () => binomialSample(random, 20, p))
    );
    const batches = shots.map((_, i) => `run ${Math.floor(i / 300)}`);
    const { answer, moments } = await diagnose({ kind: 'shots', shots, batches }, options);
    expect(moments.dispersion.value!).toBeLessThan(1);
    expect(answer.verdict).toBe('ruled-out');
    expect(answer.statement).toMatch(/But the rate changed while the shots were taken/);
  });
});
