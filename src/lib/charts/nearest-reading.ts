import type { Reading } from './picture';

/** Index of the reading that a pointer at x, y means: nearest across, and height decides only between near ones. */
export function nearestReading(readings: Reading[], x: number, y: number): number {
  let best = -1;
  let least = Infinity;
  readings.forEach((reading, i) => {
    const distance = (reading.x - x) ** 2 + 0.02 * (reading.y - y) ** 2;
    if (distance < least) {
      least = distance;
      best = i;
    }
  });
  return best;
}
