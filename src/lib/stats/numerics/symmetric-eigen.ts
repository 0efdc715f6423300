/**
 * Eigenvalues and eigenvectors of a small symmetric matrix by cyclic Jacobi rotations.
 *
 * @param matrix size × size, row by row; not changed
 * @returns values[k] with its vector in column k of `vectors` (row by row)
 *
 * Meant for at most a dozen rows, where it is as quick as anything and right to machine precision.
 * Source: Golub & Van Loan, Matrix Computations, section 8.5 (from memory).
 */
export function symmetricEigen(
  matrix: ArrayLike<number>,
  size: number
): { values: number[]; vectors: number[] } {
  const a = new Array<number>(size * size);
  for (let i = 0; i < size * size; i++) a[i] = matrix[i];
  const vectors = new Array<number>(size * size).fill(0);
  for (let i = 0; i < size; i++) vectors[i * size + i] = 1;
  for (let sweep = 0; sweep < 30; sweep++) {
    let off = 0;
    let on = 0;
    for (let i = 0; i < size; i++) {
      on += a[i * size + i] ** 2;
      for (let j = 0; j < i; j++) off += a[i * size + j] ** 2;
    }
    if (off <= 1e-24 * on) break;
    for (let i = 0; i < size - 1; i++) for (let j = i + 1; j < size; j++) rotate(a, vectors, size, i, j);
  }
  const values = new Array<number>(size).fill(0);
  for (let i = 0; i < size; i++) values[i] = a[i * size + i];
  return { values, vectors };
}

/** Both triangles of `a` are kept, so that its rows can be read either way. */
function rotate(a: number[], vectors: number[], size: number, i: number, j: number): void {
  const between = a[i * size + j];
  if (between === 0) return;
  const first = a[i * size + i];
  const second = a[j * size + j];
  const ratio = (second - first) / (2 * between);
  const tangent = Math.sign(ratio || 1) / (Math.abs(ratio) + Math.sqrt(1 + ratio * ratio));
  const cosine = 1 / Math.sqrt(1 + tangent * tangent);
  const sine = tangent * cosine;
  for (let k = 0; k < size; k++) {
    const at = k * size;
    if (k !== i && k !== j) {
      const x = a[at + i];
      const y = a[at + j];
      a[at + i] = a[i * size + k] = cosine * x - sine * y;
      a[at + j] = a[j * size + k] = sine * x + cosine * y;
    }
    const u = vectors[at + i];
    const v = vectors[at + j];
    vectors[at + i] = cosine * u - sine * v;
    vectors[at + j] = sine * u + cosine * v;
  }
  a[i * size + i] = first - tangent * between;
  a[j * size + j] = second + tangent * between;
  a[i * size + j] = a[j * size + i] = 0;
}
