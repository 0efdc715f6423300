import type { DistributionPoint } from '$lib/stats/types';
import type { ScaleLinear } from 'd3-scale';
import { lumpMiddle } from './lump-marks';
import type { Tick } from './picture';
import { roomyTicks } from './roomy-ticks';
import { tickTexts } from './tick-texts';

/**
 * Ticks of an axis of counts, at whole counts only; those of rows that lump counts read "0–2" and "10+", stand under the
 * middle of their bars, and no other tick lies under these.
 * @param text height of the letters, picture units
 */
export function countTicks(
  scale: ScaleLinear<number, number>,
  text: number,
  lumps: Pick<DistributionPoint, 'count' | 'below'>[] = []
): Tick[] {
  const ticks = roomyTicks(scale, text, Number.isInteger);
  if (lumps.length === 0) return ticks;
  const named = lumps.map((lump): Tick => {
    const [count] = tickTexts([lump.count]);
    return { at: scale(lumpMiddle(lump)), text: lump.below ? `0–${count}` : `${count}+` };
  });
  const room = (a: Tick, b: Tick) => (a.text.length + b.text.length) * 0.3 * text + 0.7 * text;
  const outside = ({ at }: Tick) =>
    lumps.every(({ count, below }) => (below ? at > scale(count) : at < scale(count)));
  const single = ticks.filter(
    (tick) => outside(tick) && named.every((lump) => Math.abs(tick.at - lump.at) >= room(tick, lump))
  );
  const [first, second] = named;
  const both = second === undefined || Math.abs(first.at - second.at) >= room(first, second);
  return both ? [...single, ...named] : [...single, second];
}
