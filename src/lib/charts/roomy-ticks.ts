import type { ScaleLinear } from 'd3-scale';
import type { Tick } from './picture';
import { tickTexts } from './tick-texts';

/**
 * Ticks of a bottom axis whose labels neither touch nor run off the picture: as many round values as fit, then every
 * second, fifth or tenth of them, since how long a label is shows only once its values are chosen.
 *
 * @param text height of the letters, picture units; a digit is 0.6 of it wide, the margin at the right 1.8
 * @param fits which values may be marked at all
 */
export function roomyTicks(
  scale: ScaleLinear<number, number>,
  text: number,
  fits: (value: number) => boolean = () => true
): Tick[] {
  const [left, right] = scale.range();
  const values = scale.ticks(Math.max(2, Math.floor((right - left) / (text * 4)))).filter(fits);
  const texts = tickTexts(values);
  const ticks = values.map((value, i): Tick & { value: number } => ({
    value,
    at: scale(value),
    text: texts[i]
  }));
  const longest = Math.max(0, ...texts.map((label) => label.length));
  const step = values.length > 1 ? values[1] - values[0] : 1;
  const gap = values.length > 1 ? ticks[1].at - ticks[0].at : Infinity;
  const needed = longest * 0.6 * text + 0.7 * text;
  const every = [1, 2, 5, 10, 20, 50].find((times) => times * gap >= needed) ?? 100;
  const kept = ticks.filter(({ value }) => Math.round(value / step) % every === 0);
  // Where no multiple falls into view the first of them stands alone: an axis needs a number.
  return (kept.length ? kept : ticks.slice(0, 1))
    .filter(({ at, text: label }) => at + label.length * 0.3 * text <= right + 1.7 * text)
    .map(({ at, text: label }) => ({ at, text: label }));
}
