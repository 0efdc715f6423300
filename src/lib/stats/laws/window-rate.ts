import type { Window } from './window';

/**
 * Large-deviation rate of a count, sup_θ [θn − ln E e^{θX}] in nats a shot, from the pmf; e^{−rate} is Chernoff's bound.
 *
 * @returns ≥ 0; at the ends of the support −ln f_n; Infinity outside
 */
export function windowRate({ first, values, scale }: Window, count: number): number {
  const logs: [n: number, log: number][] = [];
  values.forEach((value, i) => value > 0 && logs.push([first + i, Math.log(value / scale)]));
  if (logs.length === 0) return Infinity;
  const [bottom, top] = [logs[0], logs[logs.length - 1]];
  if (count < bottom[0] || count > top[0]) return Infinity;
  if (count === bottom[0]) return -bottom[1];
  if (count === top[0]) return -top[1];
  const at = (theta: number): { log: number; mean: number } => {
    let most = -Infinity;
    for (const [n, log] of logs) most = Math.max(most, log + theta * (n - count));
    let sum = 0;
    let weighed = 0;
    for (const [n, log] of logs) {
      const term = Math.exp(log + theta * (n - count) - most);
      sum += term;
      weighed += term * (n - count);
    }
    return { log: most + Math.log(sum), mean: weighed / sum };
  };
  let [low, high] = [-1, 1];
  while (at(low).mean > 0 && low > -2048) low *= 2;
  while (at(high).mean < 0 && high < 2048) high *= 2;
  for (let step = 0; step < 60; step++) {
    const middle = (low + high) / 2;
    if (at(middle).mean < 0) low = middle;
    else high = middle;
  }
  return Math.max(0, -at((low + high) / 2).log);
}
