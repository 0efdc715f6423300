import type { CumulantsPlace } from './cumulants-place';

/**
 * What the cumulants chart shows: the whole region with the Poisson corner, and the counts wherever they lie. Their
 * intervals may be cut, at half the region beyond the point and all else that is drawn.
 */
export function regionSpan({ fano, third, law }: CumulantsPlace): {
  x: [number, number];
  y: [number, number];
} {
  const right = Math.max(
    1.12,
    1.06 * fano.value,
    Math.min(1.06 * (fano.high ?? 0), 1.5 * fano.value),
    law.fano
  );
  const points = [-1 / 8, 1, third.value, law.third];
  const [least, most] = [Math.min(...points), Math.max(...points)];
  const reach = 0.5 * (most - least);
  const low = Math.max(least - reach, Math.min(least, third.low ?? least));
  const high = Math.min(most + reach, Math.max(most, third.high ?? most));
  const room = 0.06 * (high - low);
  return { x: [Math.min(0, 1.06 * (fano.low ?? 0)) - 0.03 * right, right], y: [low - room, high + room] };
}
