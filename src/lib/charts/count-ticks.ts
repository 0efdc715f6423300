import type { ScaleLinear } from 'd3-scale';
import type { Tick } from './picture';
import { roomyTicks } from './roomy-ticks';
import { tickTexts } from './tick-texts';

/**
 * Ticks of an axis of counts, at whole counts only; the lump's tick reads "10+".
 * @param text height of the letters, picture units
 */
export function countTicks(scale: ScaleLinear<number, number>, text: number, lump: number | null): Tick[] {
  const last = lump === null ? null : { at: scale(lump), text: `${tickTexts([lump])[0]}+` };
  const ticks = roomyTicks(scale, text, Number.isInteger);
  if (last === null) return ticks;
  const room = (tick: Tick) => (tick.text.length + last.text.length) * 0.3 * text + 0.7 * text;
  return [...ticks.filter((tick) => Math.abs(tick.at - last.at) >= room(tick)), last];
}
