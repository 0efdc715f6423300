import { binomialInversion } from './binomial-inversion';
import { binomialRejection } from './binomial-rejection';
import type { Generator } from './generator';

/** Draws histograms of a given number of shots from one law. */
export interface HistogramSampler {
  /** Fills `into` (one cell per cell of the law) with a multinomial draw of `shots` shots. */
  draw(generator: Generator, shots: number, into: Float64Array): void;
}

/**
 * Multinomial sampler by binomial splitting: cells in falling order of probability, each taking
 * Bin(shots left, f_i / (f_i + … + f_last)); the last cell takes the rest. Exact law, time independent of the
 * number of shots: 1.5 µs for 13 cells, 3 µs for the 65 of Bin(64, 0.15), 15 to 20 µs for 200 equal cells.
 *
 * The falling order was measured beside the given order and two balanced trees: fastest or within noise in 22 of
 * 24 settings, up to twice as fast where shots are few, since it ends when none is left.
 *
 * @param pmf probabilities or any weights ≥ 0 (a histogram resamples itself); they need not sum to 1
 * @throws RangeError for a negative, infinite or NaN weight, for no positive weight, for a number of shots that is
 *   no integer 0 … 2^53 − 1, and for an `into` of another length
 *
 * Source: Devroye 1986, Non-Uniform Random Variate Generation, ch. XI.1.4 (m).
 */
export function histogramSampler(pmf: ArrayLike<number>): HistogramSampler {
  const order: number[] = [];
  for (let i = 0; i < pmf.length; i++) {
    if (!(pmf[i] >= 0 && pmf[i] < Infinity)) throw new RangeError(`weight ${i} is ${pmf[i]}`);
    if (pmf[i] > 0) order.push(i);
  }
  if (order.length === 0) throw new RangeError('no cell has a positive weight');
  order.sort((i, j) => pmf[j] - pmf[i] || i - j);

  const last = order.length - 1;
  const cells = Int32Array.from(order);
  // The smaller of "this cell" and "a later one", so that neither is lost to 1 − p, and which of the two it is.
  const smaller = new Float64Array(order.length);
  const logMissed = new Float64Array(order.length);
  const mirrored = new Uint8Array(order.length);
  // Summed from the smallest up, and relative to the largest: weights may be near the largest double.
  let later = 0;
  for (let j = last; j >= 0; j--) {
    const here = pmf[order[j]] / pmf[order[0]];
    mirrored[j] = here > later ? 1 : 0;
    smaller[j] = Math.min(here, later) / (here + later);
    logMissed[j] = Math.log1p(-smaller[j]);
    later += here;
  }

  return {
    draw(generator, shots, into) {
      if (into.length !== pmf.length) throw new RangeError(`${into.length} cells for ${pmf.length}`);
      if (!Number.isSafeInteger(shots) || shots < 0) throw new RangeError(`not a number of shots: ${shots}`);
      into.fill(0);
      let left = shots;
      for (let j = 0; j < last && left > 0; j++) {
        const p = smaller[j];
        const drawn =
          left * p >= 30
            ? binomialRejection(generator, left, p)
            : binomialInversion(generator, left, p, logMissed[j]);
        const taken = mirrored[j] ? left - drawn : drawn;
        into[cells[j]] = taken;
        left -= taken;
      }
      into[cells[last]] += left;
    }
  };
}
