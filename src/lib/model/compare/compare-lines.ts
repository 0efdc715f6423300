import type { ComparedPart, ComparedValue } from './compared';

export type NamedValue = readonly [name: string, first: ComparedValue, second: ComparedValue];

/** A part from the values of both results: a line has changed when its values are not exactly the same. */
export function compareLines(id: ComparedPart['id'], title: string, values: NamedValue[]): ComparedPart {
  const lines = values.map(([name, first, second]) => ({
    name,
    first,
    second,
    changed: JSON.stringify(first) !== JSON.stringify(second)
  }));
  return { id, title, lines, changes: lines.filter((line) => line.changed).length };
}
