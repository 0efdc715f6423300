import { certificate } from '$lib/stats/bounds/certificate';
import { betaSample } from '$lib/stats/random/beta-sample';
import { binomialSample } from '$lib/stats/random/binomial-sample';
import { generator, type Generator } from '$lib/stats/random/generator';
import { poissonSample } from '$lib/stats/random/poisson-sample';
import { describe, expect, it } from 'vitest';

function tally(shots: number, draw: () => number): [number, number][] {
  const seen = new Map<number, number>();
  for (let i = 0; i < shots; i++) {
    const n = draw();
    seen.set(n, (seen.get(n) ?? 0) + 1);
  }
  return [...seen].sort((a, b) => a[0] - b[0]);
}

describe('certificate on simulated counts', () => {
  const repeats = (
    count: number,
    shots: number,
    trials: number | null,
    draw: (source: Generator) => number
  ) =>
    Array.from({ length: count }, (_, stream) => {
      const source = generator(1956, stream);
      return certificate({ counts: tally(shots, () => draw(source)), lump: null, shots, trials })?.p ?? 1;
    });

  it('sees a correlation of 0.004 between 64 sites in 20000 shots', () => {
    // Beta-binomial, p = 0.15, ρ = 0.004: a + b = 1/ρ − 1.
    const [a, b] = [0.15 * 249, 0.85 * 249];
    const p = repeats(12, 20_000, 64, (source) => binomialSample(source, 64, betaSample(source, a, b)));
    expect(Math.max(...p)).toBeLessThan(2e-6);
  });

  it.each<[string, number, number | null, (source: Generator) => number]>([
    ['equal trials', 2000, 64, (source) => binomialSample(source, 64, 0.15)],
    ['few shots', 50, 12, (source) => binomialSample(source, 12, 0.5)],
    [
      'spread trials',
      500,
      64,
      (source) => binomialSample(source, 32, 0.02) + binomialSample(source, 32, 0.28)
    ],
    ['rare events', 500, null, (source) => poissonSample(source, 3)]
  ])('does not accuse %s', (_, shots, trials, draw) => {
    const p = repeats(400, shots, trials, draw);
    expect(p.filter((value) => value <= 0.05).length).toBeLessThanOrEqual(20);
  });
});
