/**
 * Autocorrelations r_1 … r_m of a series, r_k = Σ (x_i − x̄)(x_{i+k} − x̄) / Σ (x_i − x̄)².
 *
 * @param series at least m + 1 numbers
 * @param lags m ≥ 0
 * @returns NaN for a series that does not vary
 *
 * Source: Box & Jenkins 1970, Time Series Analysis, ch. 2 (m).
 */
export function autocorrelations(series: ArrayLike<number>, lags: number): number[] {
  const length = series.length;
  let sum = 0;
  for (let i = 0; i < length; i++) sum += series[i];
  const mean = sum / length;
  const d = new Float64Array(length);
  let square = 0;
  for (let i = 0; i < length; i++) {
    d[i] = series[i] - mean;
    square += d[i] * d[i];
  }
  const found: number[] = [];
  for (let lag = 1; lag <= lags; lag++) {
    let product = 0;
    for (let i = lag; i < length; i++) product += d[i] * d[i - lag];
    found.push(product / square);
  }
  return found;
}
