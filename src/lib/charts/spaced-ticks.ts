/**
 * Keeps labels from touching: every tick keeps its stroke, and only so many keep a label as fit.
 * @param values ascending tick values
 * @param place value → picture units
 * @param room picture units that one label needs, its gap included
 */
export function spacedTicks(values: number[], place: (value: number) => number, room: number): number[] {
  const kept: number[] = [];
  let last = -Infinity;
  for (const value of values) {
    const at = place(value);
    if (Math.abs(at - last) < room) continue;
    kept.push(value);
    last = at;
  }
  return kept;
}
