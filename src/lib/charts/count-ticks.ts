import type { ScaleLinear } from 'd3-scale';
import type { Tick } from './picture';
import { tickTexts } from './tick-texts';

/**
 * Ticks of an axis of counts, at whole counts only; the lump's tick reads "10+".
 * @param room picture units that one label needs
 */
export function countTicks(scale: ScaleLinear<number, number>, room: number, lump: number | null): Tick[] {
  const [left, right] = scale.range();
  const most = Math.max(2, Math.floor((right - left) / room));
  const values = scale.ticks(most).filter(Number.isInteger);
  const near = lump === null ? values : values.filter((v) => Math.abs(scale(v) - scale(lump)) >= room);
  const texts = tickTexts(near);
  const ticks = near.map((value, i) => ({ at: scale(value), text: texts[i] }));
  if (lump !== null) ticks.push({ at: scale(lump), text: `${tickTexts([lump])[0]}+` });
  return ticks;
}
