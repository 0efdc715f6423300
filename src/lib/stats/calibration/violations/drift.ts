import { binomialSample } from '../../random/binomial-sample';
import type { Violation } from '../violation';

const SITES = 64;
const P = 0.15;
const BATCHES = 10;

/** A shot list in ten batches, whose probability rises evenly from p(1 − d) to p(1 + d). */
export const drift: Violation = {
  id: 'drift',
  about: 'shot list in ten batches, N = 64, p from 0.15(1 − d) to 0.15(1 + d); strength d',
  trials: SITES,
  strengths: [0.03, 0.1, 0.2],
  draw: (random, shots, rise) => {
    const counts = new Uint32Array(shots);
    const batches = new Array<string>(shots);
    for (let i = 0; i < shots; i++) {
      counts[i] = binomialSample(random, SITES, P * (1 + rise * ((2 * i + 1) / shots - 1)));
      batches[i] = String(Math.floor((i * BATCHES) / shots) + 1);
    }
    return { kind: 'shots', shots: counts, batches };
  }
};
