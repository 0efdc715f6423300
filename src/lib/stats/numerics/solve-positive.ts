/**
 * Solves A x = b for a small symmetric positive definite A (size × size, row by row) by Cholesky factors.
 *
 * @param x receives the solution
 * @param lower room for the factor, size × size
 * @returns false when A is not positive definite; `x` then holds nothing
 */
export function solvePositive(
  matrix: Float64Array,
  size: number,
  right: Float64Array,
  x: Float64Array,
  lower: Float64Array
): boolean {
  for (let i = 0; i < size; i++) {
    let solved = right[i];
    for (let j = 0; j <= i; j++) {
      let sum = matrix[i * size + j];
      for (let k = 0; k < j; k++) sum -= lower[i * size + k] * lower[j * size + k];
      if (i > j) lower[i * size + j] = sum / lower[j * size + j];
      else if (sum > 1e-11 * matrix[i * size + i]) lower[i * size + i] = Math.sqrt(sum);
      else return false;
    }
    for (let k = 0; k < i; k++) solved -= lower[i * size + k] * x[k];
    x[i] = solved / lower[i * size + i];
  }
  for (let i = size - 1; i >= 0; i--) {
    let sum = x[i];
    for (let k = i + 1; k < size; k++) sum -= lower[k * size + i] * x[k];
    x[i] = sum / lower[i * size + i];
  }
  return true;
}
