/**
 * Ljung and Box's statistic of serial correlation, Q = n(n + 2) Σ_k r_k²/(n − k), close to chi-square with one
 * degree of freedom for each lag when the order of the shots means nothing.
 *
 * @param length n, the number of shots
 * @param correlations r_1 … r_m, m < n
 *
 * Source: Ljung & Box 1978, Biometrika 65:297.
 */
export function ljungBox(length: number, correlations: readonly number[]): number {
  const sum = correlations.reduce((total, r, i) => total + (r * r) / (length - 1 - i), 0);
  return length * (length + 2) * sum;
}
