/** All orders of a short list, equal values counted apart. */
export function orders(values: readonly number[]): number[][] {
  if (values.length <= 1) return [[...values]];
  return values.flatMap((value, i) =>
    orders([...values.slice(0, i), ...values.slice(i + 1)]).map((rest) => [value, ...rest])
  );
}

export function meanAndVariance(values: readonly number[]): { mean: number; variance: number } {
  const mean = values.reduce((sum, x) => sum + x, 0) / values.length;
  return { mean, variance: values.reduce((sum, x) => sum + (x - mean) ** 2, 0) / values.length };
}
