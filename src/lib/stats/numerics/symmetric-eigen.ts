/**
 * Eigenvalues and eigenvectors of a small symmetric matrix by cyclic Jacobi rotations, in place.
 *
 * @param a size × size, row by row; its diagonal ends as the eigenvalues
 * @param vectors receives the vector of the k-th eigenvalue in column k (row by row)
 *
 * Meant for at most a dozen rows, where it is as quick as anything and right to machine precision.
 * Source: Golub & Van Loan, Matrix Computations, section 8.5 (from memory).
 */
export function symmetricEigen(a: Float64Array, size: number, vectors: Float64Array): void {
  for (let i = 0; i < size * size; i++) vectors[i] = 0;
  for (let i = 0; i < size; i++) vectors[i * size + i] = 1;
  for (let sweep = 0; sweep < 30; sweep++) {
    let off = 0;
    let on = 0;
    for (let i = 0; i < size; i++) {
      on += a[i * size + i] * a[i * size + i];
      for (let j = 0; j < i; j++) off += a[i * size + j] * a[i * size + j];
    }
    if (off <= 1e-24 * on) break;
    for (let i = 0; i < size - 1; i++) for (let j = i + 1; j < size; j++) rotate(a, vectors, size, i, j);
  }
}

/** Both triangles of `a` are kept, so that its rows can be read either way. */
function rotate(a: Float64Array, vectors: Float64Array, size: number, i: number, j: number): void {
  const between = a[i * size + j];
  if (between === 0) return;
  const first = a[i * size + i];
  const second = a[j * size + j];
  const ratio = (second - first) / (2 * between);
  const hypotenuse = Math.abs(ratio) + Math.sqrt(1 + ratio * ratio);
  const tangent = ratio < 0 ? -1 / hypotenuse : 1 / hypotenuse;
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
