import type { Picture } from '../picture';

const STEPS: Record<string, number> = { ArrowRight: 1, ArrowUp: 1, ArrowLeft: -1, ArrowDown: -1 };

/**
 * How many readings a key walks, ±Infinity to an end; null for keys that do not walk. Page keys take a twentieth of
 * the way, ten readings at least. Where readings follow one another down the picture, the keys that mean down go on.
 */
export function stepOfKey(
  key: string,
  { readings, order }: Pick<Picture, 'readings' | 'order'>
): number | null {
  if (key === 'Home') return -Infinity;
  if (key === 'End') return Infinity;
  const down = order === 'down' ? -1 : 1;
  const page = Math.max(10, Math.round(readings.length / 20));
  if (key === 'PageUp') return page * down;
  if (key === 'PageDown') return -page * down;
  const step = STEPS[key];
  if (step === undefined) return null;
  return key === 'ArrowUp' || key === 'ArrowDown' ? step * down : step;
}
