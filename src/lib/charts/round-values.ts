/** From these shares of a power of ten on, the step is 10, 5 or 2 of it: geometric means of neighbours. */
const STEPS: [number, number][] = [
  [Math.sqrt(50), 10],
  [Math.sqrt(10), 5],
  [Math.sqrt(2), 2]
];

/**
 * About `count` values within an interval, all multiples of 1, 2 or 5 times a power of ten.
 *
 * @param from end of the interval; may lie above `to`, and the values then fall
 */
export function roundValues(from: number, to: number, count: number): number[] {
  if (!(count > 0)) return [];
  if (from === to) return [from];
  if (to < from) return roundValues(to, from, count).reverse();
  const raw = (to - from) / count;
  const power = Math.floor(Math.log10(raw));
  const share = raw / 10 ** power;
  const factor = STEPS.find(([least]) => share >= least)?.[1] ?? 1;
  // Below 1 the inverse of the step is the whole number, and dividing by it gives 0.3 where multiplying gives
  // 0.30000000000000004.
  const whole = power < 0 ? 10 ** -power / factor : 10 ** power * factor;
  const value = (i: number): number => (power < 0 ? i / whole : i * whole);
  let first = Math.round(power < 0 ? from * whole : from / whole);
  let last = Math.round(power < 0 ? to * whole : to / whole);
  if (value(first) < from) first++;
  if (value(last) > to) last--;
  // One or two values were asked for and none lies inside: twice as many find one.
  if (last < first && count >= 0.5 && count < 2) return roundValues(from, to, count * 2);
  // Not a number either, where the ends differ by less than 1e-308.
  if (!(last >= first)) return [];
  return Array.from({ length: last - first + 1 }, (_, i) => value(first + i));
}
