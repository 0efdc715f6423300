import type { ScaleLinear } from 'd3-scale';
import type { Tick } from './picture';
import { roomyTicks } from './roomy-ticks';
import { tickTexts } from './tick-texts';

/** Rows that lump counts: the first count of the closing one, the last of the opening one. */
export interface LumpEdges {
  from: number | null;
  to: number | null;
}

/**
 * Ticks of an axis of counts, at whole counts only; those of lumps read "10+" and "0–2".
 * @param text height of the letters, picture units
 */
export function countTicks(
  scale: ScaleLinear<number, number>,
  text: number,
  { from, to }: LumpEdges = { from: null, to: null }
): Tick[] {
  const ticks = roomyTicks(scale, text, Number.isInteger);
  const lumps: Tick[] = [
    ...(to === null ? [] : [{ at: scale(to), text: `0–${tickTexts([to])[0]}` }]),
    ...(from === null ? [] : [{ at: scale(from), text: `${tickTexts([from])[0]}+` }])
  ];
  if (lumps.length === 0) return ticks;
  const room = (a: Tick, b: Tick) => (a.text.length + b.text.length) * 0.3 * text + 0.7 * text;
  const single = ticks.filter(
    (tick) =>
      (to === null || tick.at > scale(to)) &&
      lumps.every((lump) => Math.abs(tick.at - lump.at) >= room(tick, lump))
  );
  const [first, second] = lumps;
  const both = second === undefined || Math.abs(first.at - second.at) >= room(first, second);
  return both ? [...single, ...lumps] : [...single, second];
}
