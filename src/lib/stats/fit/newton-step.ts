import { solvePositive } from '../numerics/solve-positive';
import { symmetricEigen } from '../numerics/symmetric-eigen';
import type { StepBuffers } from './step-buffers';
import type { TrialLevels } from './trial-levels';

/** No angle moves further than this in a step: beyond, the quadratic picture of the likelihood is no guide. */
const longest = 0.35;

/**
 * The step in angles from levels whose gradient and Hessian are in `buffers`, into buffers.angles: −H⁻¹g where H is
 * negative definite and the step short; else along its eigenvectors by the size of each eigenvalue, each part kept
 * short, so that saddles repel (Dauphin et al. 2014).
 *
 * @returns the gain that the quadratic picture promises, nats
 */
export function newtonStep(levels: TrialLevels, buffers: StepBuffers): number {
  const { size, gradient, hessian, first, second, pull, bowl, angles } = buffers;
  const count = levels.p.length;
  for (let j = 0; j < size; j++) {
    // p = sin²φ: dp/dφ = 2√(p(1−p)), d²p/dφ² = 2(1−2p); γ = ψ²: 2√γ and 2.
    first[j] = j < count ? 2 * Math.sqrt(levels.p[j] * (1 - levels.p[j])) : 2 * Math.sqrt(levels.poissonPart);
    second[j] = j < count ? 2 * (1 - 2 * levels.p[j]) : 2;
    pull[j] = gradient[j] * first[j];
  }
  for (let j = 0; j < size; j++) {
    for (let k = 0; k < size; k++) bowl[j * size + k] = -hessian[j * size + k] * first[j] * first[k];
    bowl[j * size + j] -= gradient[j] * second[j];
  }
  if (!solvePositive(bowl, size, pull, angles, buffers.lower) || !short(angles, size)) {
    return alongEigenvectors(buffers);
  }
  let promise = 0;
  for (let j = 0; j < size; j++) promise += 0.5 * angles[j] * pull[j];
  return promise;
}

function alongEigenvectors({ size, pull, bowl, vectors, angles }: StepBuffers): number {
  symmetricEigen(bowl, size, vectors);
  let stiffest = 0;
  for (let k = 0; k < size; k++) stiffest = Math.max(stiffest, Math.abs(bowl[k * size + k]));
  for (let j = 0; j < size; j++) angles[j] = 0;
  let promise = 0;
  for (let k = 0; k < size; k++) {
    const value = bowl[k * size + k];
    let along = 0;
    for (let j = 0; j < size; j++) along += vectors[j * size + k] * pull[j];
    let length = along / Math.max(Math.abs(value), 1e-9 * stiffest, 1e-300);
    length = Math.max(-longest, Math.min(longest, length));
    promise += along * length * (value > 0 ? 0.5 : 1);
    for (let j = 0; j < size; j++) angles[j] += vectors[j * size + k] * length;
  }
  return promise;
}

function short(angles: Float64Array, size: number): boolean {
  for (let j = 0; j < size; j++) if (!(Math.abs(angles[j]) < longest)) return false;
  return true;
}
