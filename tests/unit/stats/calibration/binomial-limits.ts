/** P(X = k) of Bin(n, p) for k = 0 … n, by the recurrence of its logarithm: (1 − p)^n alone may underflow. */
function pmf(n: number, p: number): number[] {
  const logs = [n * Math.log1p(-p)];
  for (let k = 0; k < n; k++) logs.push(logs[k] + Math.log(((n - k) * p) / ((k + 1) * (1 - p))));
  return logs.map(Math.exp);
}

/** Smallest k that Bin(n, p) passes with odds of at most one in a thousand: its 99.9 % quantile. */
export function highest(n: number, p: number): number {
  let below = 0;
  return pmf(n, p).findIndex((f) => (below += f) >= 0.999);
}

/** Largest k that Bin(n, p) falls under with odds of at most one in a thousand: its 0.1 % quantile. */
export function lowest(n: number, p: number): number {
  let upTo = 0;
  return pmf(n, p).findIndex((f) => (upTo += f) > 0.001);
}
