import type { Frame } from './picture';

/**
 * The plotting rectangle of a picture `width` × `height` with these margins.
 * Never thinner than 40 units a side, so scales stay finite on a very narrow page.
 */
export function frameOf(
  width: number,
  height: number,
  margin: { left: number; right: number; top: number; bottom: number }
): Frame {
  return {
    left: margin.left,
    right: Math.max(margin.left + 40, width - margin.right),
    top: margin.top,
    bottom: Math.max(margin.top + 40, height - margin.bottom)
  };
}
