import { solveSymmetric } from '../numerics/solve-symmetric';

/**
 * Inverse of a small symmetric positive definite matrix (size × size, row by row), scaled to unit diagonal first, so
 * that quantities of very different size do not hide a singular matrix or seem to be one.
 *
 * @returns null where a diagonal entry is not positive, or a direction is under 1e-12 of its own
 */
export function inverseSymmetric(matrix: readonly number[], size: number): number[] | null {
  const scale = Array.from({ length: size }, (_, i) => Math.sqrt(matrix[i * (size + 1)]));
  if (!scale.every((one) => one > 0 && one < Infinity)) return null;
  const unit = matrix.map((value, k) => value / (scale[Math.floor(k / size)] * scale[k % size]));
  const inverse = new Array<number>(size * size);
  for (let j = 0; j < size; j++) {
    const column = solveSymmetric(
      unit,
      size,
      scale.map((_, i) => (i === j ? 1 : 0))
    );
    // A direction that is nothing is solved as 0, and an inverse never has a diagonal entry below 1 here.
    if (!(column[j] >= 1 - 1e-9)) return null;
    for (let i = 0; i < size; i++) inverse[i * size + j] = column[i] / (scale[i] * scale[j]);
  }
  return inverse;
}
