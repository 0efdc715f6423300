import { lawWindow } from '$lib/stats/laws/law-window';
import { generator } from '$lib/stats/random/generator';
import { histogramSampler } from '$lib/stats/random/histogram-sampler';
import { landauZenerLaw } from '$lib/stats/references/landau-zener-law';

/** Quench times a = 2πJτ over two decades, 1 to 100. */
export const quenchTimes = (points: number): number[] =>
  Array.from({ length: points }, (_, i) => 10 ** ((2 * i) / (points - 1)));

/** pmf of Landau–Zener pairs of 256 modes at quench time a, from count 0. */
export function landauZenerPmf(a: number): Float64Array {
  const { first, values } = lawWindow(landauZenerLaw(256, a), 1e-12);
  const pmf = new Float64Array(first + values.length);
  pmf.set(values, first);
  return pmf;
}

/**
 * A law after loss in pairs at rate n(n − 1)/2 for a time, by the master equation in 400 steps of Euler: each step
 * keeps all probability, and its own error does not matter here, where only some loss in pairs is wanted.
 */
export function lostInPairs(pmf: Float64Array, time: number): Float64Array {
  let law = pmf;
  for (let step = 0; step < 400; step++) {
    const next = new Float64Array(law.length);
    for (let n = 0; n < law.length; n++) {
      const gone = Math.min(1, (n * (n - 1) * time) / 800);
      next[n] += law[n] * (1 - gone);
      if (n > 1) next[n - 2] += law[n] * gone;
    }
    law = next;
  }
  return law;
}

/** Histograms drawn from laws, one a law. */
export function drawn(laws: ArrayLike<number>[], shots: number, seed: number): [number, number][][] {
  const random = generator(seed, 1);
  return laws.map((pmf) => {
    const into = new Float64Array(pmf.length);
    histogramSampler(pmf).draw(random, shots, into);
    return [...into].map((seen, n): [number, number] => [n, seen]).filter(([, seen]) => seen > 0);
  });
}
