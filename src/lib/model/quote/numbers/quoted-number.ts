/** A number as it will be read, before any notation: `digits` × 10^`power`, or `digits` alone. */
export interface QuotedNumber {
  negative: boolean;
  /** Decimal digits with a point where there is one, trailing zeros kept: "4.0520", "12350", "0". */
  digits: string;
  /** Null for a number written out. */
  power: number | null;
  /** What was rounded. */
  value: number;
}

/** From 1e9 on and under 1e-4 powers of ten are written, as everywhere in the program. */
export const LARGEST_WRITTEN_OUT = 1e9;
export const SMALLEST_WRITTEN_OUT = 1e-4;

/** Exponent of the leading digit; −Infinity for 0. */
export const leading = (value: number): number =>
  value === 0 ? -Infinity : Number(value.toExponential().split('e')[1]);

/** Whether a number of this size is written out, without a power of ten. */
export const isWrittenOut = (size: number): boolean =>
  size === 0 || (size >= SMALLEST_WRITTEN_OUT && size < LARGEST_WRITTEN_OUT);
