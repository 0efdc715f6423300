/** Path string of an upright cross at x, y: a named law, to compare with. */
export function crossPath(x: number, y: number, reach = 5): string {
  const [left, top] = [x - reach, y - reach].map((value) => value.toFixed(2));
  return `M${left},${y.toFixed(2)}H${(x + reach).toFixed(2)}M${x.toFixed(2)},${top}V${(y + reach).toFixed(2)}`;
}
