import { tickTexts } from './tick-texts';

/** Digits that the margin left of an axis holds. */
const MOST = 6;

/**
 * Labels of a left axis; where they would be too long for the margin a power of ten is taken out, to stand in the
 * title instead: 0.00005, 0.00010 become 0.5, 1.0 in units of 10⁻⁴.
 */
export function scaledTexts(values: number[]): { texts: string[]; exponent: number } {
  const texts = tickTexts(values);
  if (texts.every((text) => text.length <= MOST)) return { texts, exponent: 0 };
  const largest = Math.max(...values.map(Math.abs));
  const exponent = Math.floor(Math.log10(largest) + 1e-12);
  return { texts: tickTexts(values.map((value) => value / 10 ** exponent)), exponent };
}
