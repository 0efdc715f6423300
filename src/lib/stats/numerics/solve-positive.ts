/**
 * Solves A x = b for a small symmetric positive definite A (size × size, row by row) by Cholesky factors;
 * null when A is not positive definite.
 */
export function solvePositive(
  matrix: ArrayLike<number>,
  size: number,
  right: ArrayLike<number>
): number[] | null {
  const lower = new Array<number>(size * size).fill(0);
  const x = new Array<number>(size).fill(0);
  for (let i = 0; i < size; i++) {
    let solved = right[i];
    for (let j = 0; j <= i; j++) {
      let sum = matrix[i * size + j];
      for (let k = 0; k < j; k++) sum -= lower[i * size + k] * lower[j * size + k];
      if (i > j) lower[i * size + j] = sum / lower[j * size + j];
      else if (sum > 1e-11 * matrix[i * size + i]) lower[i * size + i] = Math.sqrt(sum);
      else return null;
    }
    for (let k = 0; k < i; k++) solved -= lower[i * size + k] * x[k];
    x[i] = solved / lower[i * size + i];
  }
  for (let i = size - 1; i >= 0; i--) {
    let sum = x[i];
    for (let k = i + 1; k < size; k++) sum -= lower[k * size + i] * x[k];
    x[i] = sum / lower[i * size + i];
  }
  return x;
}
