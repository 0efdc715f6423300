import type { ComparedPart, ComparedValue } from './compared';

export type NamedValue = readonly [name: string, first: ComparedValue, second: ComparedValue];

/** Numbers that agree to this share of their size are told apart by rounding alone. */
const ROUNDING = 1e-6;
/** Of the best law, nats a shot: both below this lie on the floor, as near to the counts as numbers go. */
const NOTHING = 1e-9;

/** A part from the values of both results: a line has changed when its values are not exactly the same. */
export function compareLines(id: ComparedPart['id'], title: string, values: NamedValue[]): ComparedPart {
  const lines = values.map(([name, first, second]) => {
    const changed = JSON.stringify(first) !== JSON.stringify(second);
    return {
      name,
      first,
      second,
      changed,
      slight: changed && close(first, second, id === 'fit' ? NOTHING : 0)
    };
  });
  return { id, title, lines, changes: lines.filter((line) => line.changed && !line.slight).length };
}

function close(first: ComparedValue, second: ComparedValue, nothing: number): boolean {
  if (typeof first === 'number' && typeof second === 'number') {
    const size = Math.max(Math.abs(first), Math.abs(second));
    return size <= nothing || Math.abs(first - second) <= ROUNDING * size;
  }
  if (typeof first !== 'object' || typeof second !== 'object' || !first || !second) return first === second;
  return (['value', 'low', 'high'] as const).every((key) => close(first[key], second[key], nothing));
}
