/**
 * Where two documents differ, one path a line: numbers by more than `relative`, all else at all.
 * Numbers within 1e-12 of 0 are taken for 0.
 */
export function differences(a: unknown, b: unknown, relative: number, path = ''): string[] {
  if (typeof a === 'number' && typeof b === 'number') {
    const near = Math.abs(a - b) <= Math.max(1e-12, relative * Math.max(Math.abs(a), Math.abs(b)));
    return near ? [] : [`${path}: ${a} and ${b}`];
  }
  if (!isObject(a) || !isObject(b)) return a === b ? [] : [`${path}: ${String(a)} and ${String(b)}`];
  const keys = new Set([...Object.keys(a), ...Object.keys(b)]);
  return [...keys].flatMap((key) => differences(a[key], b[key], relative, `${path}/${key}`));
}

const isObject = (value: unknown): value is Record<string, unknown> =>
  typeof value === 'object' && value !== null;
