import type { Picture } from '../picture';

const WEIGHTS = { across: [1, 0.001], down: [0.001, 1], 'all-over': [1, 1] } as const;

/** Index of the reading that a pointer at x, y means: nearest along their order; the other way only decides ties but on a map. */
export function nearestReading(
  { readings, order }: Pick<Picture, 'readings' | 'order'>,
  x: number,
  y: number
): number {
  const [across, down] = WEIGHTS[order];
  let best = -1;
  let least = Infinity;
  readings.forEach((reading, i) => {
    const distance = across * (reading.x - x) ** 2 + down * (reading.y - y) ** 2;
    if (distance < least) {
      least = distance;
      best = i;
    }
  });
  return best;
}
