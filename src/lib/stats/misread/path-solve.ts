/**
 * Solves A x = b for the matrix with `diagonal` on its diagonal and −`beside` next to it, size × size, by elimination
 * (Thomas). Meant for diagonal > 2·beside ≥ 0, where no pivot can vanish.
 */
export function pathSolve(diagonal: number, beside: number, right: Float64Array): Float64Array {
  const size = right.length;
  const pivots = new Float64Array(size);
  const x = Float64Array.from(right);
  for (let i = 0; i < size; i++) {
    const factor = i === 0 ? 0 : beside / pivots[i - 1];
    pivots[i] = diagonal - factor * beside;
    if (i > 0) x[i] += factor * x[i - 1];
  }
  for (let i = size - 1; i >= 0; i--) x[i] = (x[i] + (i + 1 < size ? beside * x[i + 1] : 0)) / pivots[i];
  return x;
}
