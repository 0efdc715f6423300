import type { QuotedNumber } from './quoted-number';

/**
 * A number rounded to whole steps of 10^`exponent`, half away from 0, from the exact binary value.
 *
 * @param value finite
 * @param exponent of the last digit kept; the value may have at most 101 digits above it
 * @param power write it as a multiple of 10^power, power ≥ exponent; null to write it out
 * @returns trailing zeros kept; a value that rounds to 0 has no sign, and with a power it is a plain "0"
 */
export function roundAt(value: number, exponent: number, power: number | null = null): QuotedNumber {
  const steps = stepsOf(Math.abs(value), exponent);
  const zero = steps === '0';
  const behind = power === null ? -exponent : power - exponent;
  return {
    negative: value < 0 && !zero,
    digits: zero && power !== null ? '0' : placed(steps, behind),
    power: zero ? null : power,
    value
  };
}

/** Whole steps as digits. toExponential rounds the exact value, where a division would round twice. */
function stepsOf(size: number, exponent: number): string {
  const first = size === 0 ? -Infinity : Number(size.toExponential(20).split('e')[1]);
  const kept = first - exponent;
  if (kept < -1) return '0';
  if (kept === -1) return size.toExponential(20)[0] >= '5' ? '1' : '0';
  const [mantissa, after] = size.toExponential(kept).split('e');
  // 9.96 to one decimal becomes 1.00e1 with a digit too few.
  return mantissa.replace('.', '') + '0'.repeat(Number(after) - first);
}

/** Puts the point `behind` digits from the end; fewer than none are zeros before it. */
function placed(steps: string, behind: number): string {
  if (behind <= 0) return steps === '0' ? '0' : steps + '0'.repeat(-behind);
  const padded = steps.padStart(behind + 1, '0');
  return `${padded.slice(0, -behind)}.${padded.slice(-behind)}`;
}
