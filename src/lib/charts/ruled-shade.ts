import type { Frame } from './picture';

const round = (value: number): number => Math.round(value * 100) / 100;

/**
 * Slanting rules over the ground between `top` and `bottom`, path string. They lean the other way than the
 * hatch of a bound, and unlike the level lines of a scale.
 */
export function ruledShade(frame: Frame, top: number, bottom: number, spacing = 9): string {
  const from = Math.max(frame.top, top);
  const to = Math.min(frame.bottom, bottom);
  const height = to - from;
  if (height <= 0) return '';
  let path = '';
  for (let foot = frame.left + spacing; foot < frame.right + height; foot += spacing) {
    // The rule runs from its foot at the bottom up to the left; both ends are cut to the frame.
    const low = Math.max(0, foot - frame.right);
    const high = Math.min(height, foot - frame.left);
    if (high > low)
      path += `M${round(foot - low)},${round(to - low)}L${round(foot - high)},${round(to - high)}`;
  }
  return path;
}
