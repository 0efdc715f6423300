import { describe, expect, it } from 'vitest';
import { nearestReachable } from '$lib/stats/cumulants-only/nearest-reachable';
import { trialLimits } from '$lib/stats/cumulants-only/trial-limits';
import { generator, type Generator } from '$lib/stats/random/generator';

/** Cumulants of the sum of these trials, from the formulas of one trial. */
function cumulantsOf(p: number[]): number[] {
  return p.reduce(
    (sum, x) => {
      const q = x * (1 - x);
      return [sum[0] + x, sum[1] + q, sum[2] + q * (1 - 2 * x), sum[3] + q * (1 - 6 * q)];
    },
    [0, 0, 0, 0]
  );
}

const TRIALS = [1, 2, 3, 12, 50, 1000, null];

/** Cumulants in and around the body: each below, between or above the limits that those before it leave. */
function around(random: Generator): { trials: number | null; target: number[]; errors: number[] } | null {
  const trials = TRIALS[Math.floor(random.next() * TRIALS.length)];
  const target = [random.next() * Math.min(trials ?? 10, 10)];
  const orders = 2 + Math.floor(3 * random.next());
  for (let order = 1; order < orders; order++) {
    const { low, high } = trialLimits(trials, [...target, 0])[order];
    target.push(low + (high - low) * (1.4 * random.next() - 0.2));
  }
  if (!target.every(Number.isFinite)) return null;
  const errors = target.map((x) => Math.max(Math.abs(x), 0.05) * 10 ** (-0.5 - 2.5 * random.next()));
  return { trials, target, errors };
}

describe('nearestReachable', () => {
  it('has every sum of independent trials inside, by brute force over probabilities', () => {
    const random = generator(41, 1);
    for (let round = 0; round < 1000; round++) {
      const size = 1 + Math.floor(30 * random.next());
      const p = Array.from({ length: size }, () => {
        const x = random.next();
        return x < 0.1 ? 0 : x > 0.9 ? 1 : random.next();
      });
      const target = cumulantsOf(p);
      const errors = target.map(() => 0.01 + 0.1 * random.next());
      for (const trials of [size, size + 5, null]) {
        const { distance } = nearestReachable(trials, target, errors);
        expect(distance, `${p.join(' ')} of ${trials}`).toBe(0);
      }
    }
  });

  it('calls a point outside exactly where an inequality of the power sums is broken: a second way', () => {
    const random = generator(42, 1);
    const seen = { in: 0, out: 0 };
    for (let round = 0; round < 1500; round++) {
      const one = around(random);
      if (!one) continue;
      const { trials, target, errors } = one;
      const outside = trialLimits(trials, target).some(
        ({ low, high }, i) => !(target[i] >= low - 1e-12 && target[i] <= high + 1e-12)
      );
      seen[outside ? 'out' : 'in']++;
      const { distance, atLeast } = nearestReachable(trials, target, errors);
      expect(distance > 0, `${trials}: ${target.join(' ')}`).toBe(outside);
      expect(distance - atLeast).toBeLessThan(1e-4 * (1 + distance));
    }
    expect(seen.in).toBeGreaterThan(200);
    expect(seen.out).toBeGreaterThan(200);
  });

  it('is bounded on both sides: by its own parts, and by a plane that no trial reaches across', () => {
    const random = generator(43, 1);
    for (let round = 0; round < 200; round++) {
      const one = around(random);
      if (!one || one.trials === null) continue;
      const { trials, target, errors } = one;
      const found = nearestReachable(trials, target, errors);
      if (found.distance === 0) continue;
      // The parts are trials, N of them, and their cumulants are the point.
      expect(found.parts.reduce((sum, { mass }) => sum + mass, 0)).toBeCloseTo(trials, 8);
      const sum = target.map((_, i) =>
        found.parts.reduce((total, { p, mass }) => total + mass * cumulantsOf([p])[i], 0)
      );
      const gap = sum.map((x, i) => (x - target[i]) / errors[i]);
      expect(Math.hypot(...gap)).toBeCloseTo(found.distance, 6);
      // No p of a fine grid lies on the near side of the plane through it.
      for (let i = 0; i <= 2000; i++) {
        const c = cumulantsOf([i / 2000]);
        const along = gap.reduce((total, g, j) => total + (g * (trials * c[j] - target[j])) / errors[j], 0);
        expect(along / found.distance).toBeGreaterThan(found.atLeast - 1e-6 * (1 + found.distance));
      }
    }
  });

  it('is the distance to a line where that can be done by hand', () => {
    // N unknown, mean and variance alone: the body is 0 ≤ κ2 ≤ κ1. From (4, 5) with errors 0.3 and 0.4 the line
    // κ2 = κ1 lies 1/√(0.3² + 0.4²) = 2 errors away; the nearest point has mean 4 + 2·0.09/0.5 = 4.36.
    const found = nearestReachable(null, [4, 5], [0.3, 0.4]);
    expect(found.distance).toBeCloseTo(2, 8);
    expect(found.atLeast).toBeCloseTo(2, 6);
    expect(found.cumulants[0]).toBeCloseTo(4.36, 6);
    expect(found.cumulants[1]).toBeCloseTo(4.36, 6);
  });

  it('holds for N of a million, where the hull is long', () => {
    const found = nearestReachable(1e6, [4, 5, 6], [0.3, 0.4, 2]);
    expect(found.distance).toBeGreaterThan(1.9);
    expect(found.distance - found.atLeast).toBeLessThan(0.05);
  });
});
