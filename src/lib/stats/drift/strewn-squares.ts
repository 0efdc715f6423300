import type { Generator } from '../random/generator';

/**
 * Draws Σ(n − mean)² of one batch of equal trials given their total, exactly: strews the defects over the places of the
 * batch, or the empty places where those are fewer. Costs `min(T, M − T)` draws.
 *
 * @param buffer zeros, as many as the batch has shots at least; zeros again at the end
 */
export function strewnSquares(
  random: Generator,
  total: number,
  shots: number,
  trials: number | null,
  buffer: Float64Array
): number {
  const strewn = trials === null ? total : Math.min(total, shots * trials - total);
  let squares = 0;
  for (let left = strewn; left > 0;) {
    const shot = Math.floor(random.next() * shots);
    const here = buffer[shot];
    // A place already taken is drawn with chance here/N, and drawn again.
    if (trials !== null && random.next() * trials < here) continue;
    squares += 2 * here + 1;
    buffer[shot] = here + 1;
    left--;
  }
  buffer.fill(0, 0, shots);
  return squares - (strewn * strewn) / shots;
}
