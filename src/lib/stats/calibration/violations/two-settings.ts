import { binomialSample } from '../../random/binomial-sample';
import { shotsOf } from '../shots-of';
import type { Violation } from '../violation';

const SITES = 64;
const P = 0.15;

/** Two settings pooled: each shot has p − δ or p + δ with equal odds; variance 1 + 63δ²/(p(1−p)) ceilings. */
export const twoSettings: Violation = {
  id: 'two-settings',
  about: 'half the shots at p − δ, half at p + δ, N = 64, p = 0.15; strength δ',
  trials: SITES,
  strengths: [0.01, 0.02, 0.04],
  draw: (random, shots, shift) =>
    shotsOf(shots, () => binomialSample(random, SITES, random.next() < 0.5 ? P - shift : P + shift))
};
