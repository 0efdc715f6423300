import fc from 'fast-check';
import type { Law } from '$lib/stats/types';

/** One level of one trial for each probability. */
export function lawOf(p: number[], poissonPart = 0): Law {
  return { levels: p.map((one) => ({ p: one, trials: 1 })), poissonPart };
}

/**
 * Poisson-binomial pmf by going through all 2^N outcomes: the definition itself, with nothing clever in it.
 * Each outcome is a product of single probabilities, so sums of positive terms keep their digits.
 */
export function enumerate(p: number[]): number[] {
  const pmf = new Array<number>(p.length + 1).fill(0);
  for (let outcome = 0; outcome < 2 ** p.length; outcome++) {
    let probability = 1;
    let count = 0;
    for (let k = 0; k < p.length; k++) {
      const happens = (outcome >> k) & 1;
      count += happens;
      probability *= happens ? p[k] : 1 - p[k];
    }
    pmf[count] += probability;
  }
  return pmf;
}

/**
 * The same pmf as logarithms, trials added one at a time in the log domain: never under- nor overflows, and shares
 * nothing with windows and tilts. Error about 1e-16 times the largest logarithm, a trial.
 */
export function logRecurrence(p: number[]): number[] {
  let f = [0];
  for (const one of p) {
    const [happens, not] = [Math.log(one), Math.log1p(-one)];
    f = Array.from({ length: f.length + 1 }, (_, n) =>
      logSum(n < f.length ? f[n] + not : -Infinity, n > 0 ? f[n - 1] + happens : -Infinity)
    );
  }
  return f;
}

function logSum(a: number, b: number): number {
  const most = Math.max(a, b);
  return most === -Infinity ? most : most + Math.log1p(Math.exp(Math.min(a, b) - most));
}

/** Any probability, the ends and their neighbourhoods as likely as the middle. */
export const anyProbability = fc.oneof(
  // Below 1e-300 a probability can change nothing that doubles can hold, and digits are lost on the way there.
  fc.double({ min: 1e-280, max: 1, noNaN: true }),
  fc.constantFrom(0, 1, 0.5, 1e-9, 1 - 1e-9, 1e-120),
  fc.integer({ min: 1, max: 50 }).map((bits) => 2 ** -bits),
  fc.integer({ min: 1, max: 50 }).map((bits) => 1 - 2 ** -bits)
);

/** Probabilities strictly between 0 and 1, from 1e-6 to 1 − 1e-6. */
export const innerProbability = fc.double({ min: 1e-6, max: 1 - 1e-6, noNaN: true });

/** |got/want − 1|, with 0 for two zeros. */
export function relative(got: number, want: number): number {
  return got === want ? 0 : Math.abs(got - want) / Math.abs(want);
}
