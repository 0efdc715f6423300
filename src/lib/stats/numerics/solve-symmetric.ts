/**
 * Solves A x = b for a small symmetric positive semidefinite A (size × size, row by row) by Cholesky
 * factors. Directions in which A is nothing (pivot under 1e-12 of its diagonal) get x = 0.
 */
export function solveSymmetric(matrix: ArrayLike<number>, size: number, right: ArrayLike<number>): number[] {
  const lower = new Array<number>(size * size).fill(0);
  const x = new Array<number>(size).fill(0);
  for (let i = 0; i < size; i++) {
    for (let j = 0; j <= i; j++) {
      let sum = matrix[i * size + j];
      for (let k = 0; k < j; k++) sum -= lower[i * size + k] * lower[j * size + k];
      if (i === j) lower[i * size + i] = sum > 1e-12 * matrix[i * size + i] ? Math.sqrt(sum) : 0;
      else lower[i * size + j] = lower[j * size + j] > 0 ? sum / lower[j * size + j] : 0;
    }
  }
  for (let i = 0; i < size; i++) {
    let sum = right[i];
    for (let k = 0; k < i; k++) sum -= lower[i * size + k] * x[k];
    x[i] = lower[i * size + i] > 0 ? sum / lower[i * size + i] : 0;
  }
  for (let i = size - 1; i >= 0; i--) {
    let sum = x[i];
    for (let k = i + 1; k < size; k++) sum -= lower[k * size + i] * x[k];
    x[i] = lower[i * size + i] > 0 ? sum / lower[i * size + i] : 0;
  }
  return x;
}
