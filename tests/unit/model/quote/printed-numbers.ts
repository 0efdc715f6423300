import type { Interval } from '$lib/stats/types';
import { expect } from 'vitest';

/** A number as it is printed. */
export const NUMBER = String.raw`\u2212?\d[\d\u202f]*(?:\.\d+)?(?: × 10[⁻⁰¹²³⁴⁵⁶⁷⁸⁹]+)?`;

/** A printed number read back, and the size of its last digit. */
export function read(printed: string): { value: number; unit: number } {
  const [mantissa, power] = printed.replaceAll('\u202f', '').replace('\u2212', '-').split(' × 10');
  const exponent = Number([...(power ?? '⁰')].map((c) => '0123456789-'['⁰¹²³⁴⁵⁶⁷⁸⁹⁻'.indexOf(c)]).join(''));
  return {
    value: Number(`${mantissa}e${exponent}`),
    unit: Number(`1e${exponent - (mantissa.split('.')[1]?.length ?? 0)}`)
  };
}

/** Whether a printed number is this one rounded; whole numbers that end in zeros may be rounded to those. */
export function isRounded(printed: string, value: number): boolean {
  const { value: shown, unit } = read(printed);
  const zeros = /^\u2212?[1-9][\d\u202f]*$/.test(printed)
    ? (printed.replaceAll('\u202f', '').match(/0+$/)?.[0].length ?? 0)
    : 0;
  return Math.abs(shown - value) <= unit * 10 ** zeros * 0.5 * (1 + 1e-9) + Math.abs(value) * 4e-16;
}

/** Every number of a document. */
export function numbersOf(value: unknown): number[] {
  if (typeof value === 'number') return [value];
  if (typeof value !== 'object' || value === null) return [];
  return Object.values(value).flatMap(numbersOf);
}

/** `after` is followed by a value and its limits, and they are those of the document. */
export function expectInterval(text: string, after: string, { value, low, high }: Interval): void {
  const found = new RegExp(
    `${after}(${NUMBER}) \\((?:95\u202f% interval (${NUMBER}) to (${NUMBER})|no interval)`
  ).exec(text);
  expect(found, `${after} in: ${text}`).not.toBeNull();
  const [, ...printed] = found!;
  expect(isRounded(printed[0], value!), `${printed[0]} for ${value}`).toBe(true);
  if (low !== null && high !== null) {
    expect(isRounded(printed[1], low), `${printed[1]} for ${low}`).toBe(true);
    expect(isRounded(printed[2], high), `${printed[2]} for ${high}`).toBe(true);
  } else expect(printed[1]).toBeUndefined();
}
