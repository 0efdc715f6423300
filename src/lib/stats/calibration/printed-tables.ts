import type { Measured, PublishedCumulants } from '../cumulants-only/published-cumulants';
import { kStatistics } from '../moments/k-statistics';
import { betaSample } from '../random/beta-sample';
import { binomialSample } from '../random/binomial-sample';
import type { Generator } from '../random/generator';

/** Shots of a known cause, of which a table of cumulants is printed. */
export interface TableTruth {
  id: string;
  trials: number;
  /** Variance over the ceiling at that mean: 1 and less under independent trials, more otherwise. */
  dispersion: number;
  draw(random: Generator): number;
}

/** 20 trials whose shared p scatters from shot to shot: beta-binomial of mean 4. */
const bunched = (excess: number): TableTruth => {
  const weight = 19 / excess - 1;
  return {
    id: `20 trials, excess ${100 * excess} %`,
    trials: 20,
    dispersion: 1 + excess,
    draw: (random) => binomialSample(random, 20, betaSample(random, 0.2 * weight, 0.8 * weight))
  };
};

/** Three kinds of independent trials, and excesses over the ceiling from hardly to plainly visible. */
export const tableTruths: TableTruth[] = [
  {
    id: '20 equal trials, p = 0.2',
    trials: 20,
    dispersion: 1,
    draw: (random) => binomialSample(random, 20, 0.2)
  },
  {
    id: '100 equal trials, p = 0.02',
    trials: 100,
    dispersion: 1,
    draw: (random) => binomialSample(random, 100, 0.02)
  },
  {
    id: '24 trials, p = 0.1, 0.3, 0.6',
    trials: 24,
    // Σ p(1 − p) = 4.32 over 8(1 − 1/3).
    dispersion: 0.81,
    draw: (random) =>
      binomialSample(random, 8, 0.1) + binomialSample(random, 8, 0.3) + binomialSample(random, 8, 0.6)
  },
  bunched(0.05),
  bunched(0.1),
  bunched(0.2),
  bunched(0.3)
];

/** Jackknife blocks of the printed errors. */
const BLOCKS = 20;

/**
 * One table as it would be printed: k-statistics up to `order` of `shots` shots, each with its standard error from a
 * jackknife over 20 blocks. Their errors hang together, as those of real tables do.
 *
 * @param trials N as printed beside it
 * @param order 2 … 4
 */
export function printedTable(
  { draw }: TableTruth,
  random: Generator,
  shots: number,
  trials: number | null,
  order: number
): PublishedCumulants {
  const blocks = Array.from({ length: BLOCKS }, () => new Map<number, number>());
  const all = new Map<number, number>();
  for (let shot = 0; shot < shots; shot++) {
    const n = draw(random);
    for (const tally of [all, blocks[shot % BLOCKS]]) tally.set(n, (tally.get(n) ?? 0) + 1);
  }
  const whole = cumulants(all);
  const without = blocks.map((block) =>
    cumulants(new Map([...all].map(([n, seen]): [number, number] => [n, seen - (block.get(n) ?? 0)])))
  );
  const measured = whole.map((value, i): Measured => {
    const mean = without.reduce((sum, one) => sum + one[i], 0) / BLOCKS;
    const squares = without.reduce((sum, one) => sum + (one[i] - mean) ** 2, 0);
    return { value, error: Math.sqrt(((BLOCKS - 1) / BLOCKS) * squares) };
  });
  return {
    trials,
    mean: measured[0],
    variance: measured[1],
    third: order > 2 ? measured[2] : null,
    fourth: order > 3 ? measured[3] : null
  };
}

function cumulants(tally: Map<number, number>): number[] {
  const { mean, variance, third, fourth } = kStatistics([...tally].filter(([, seen]) => seen > 0));
  return [mean, variance ?? NaN, third ?? NaN, fourth ?? NaN];
}
