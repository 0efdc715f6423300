import type { Problem } from './types';

/** Megabytes with one decimal, rounded up, so that a file just above the limit shows as above it. */
const megabytes = (bytes: number) => String(Math.ceil(bytes / 104857.6) / 10);

/**
 * The refusal of a file above the limit, which it names.
 *
 * @param bytes size of the file, or null when reading stopped at the limit.
 */
export function tooLarge(bytes: number | null, limit: number): Problem {
  const message =
    bytes === null
      ? `The file is larger than ${megabytes(limit)} MB, which is the limit.`
      : `The file has ${megabytes(bytes)} MB; the limit is ${megabytes(limit)} MB.`;
  return {
    line: null,
    column: null,
    message,
    fix: 'Sum shots of equal count into a histogram: it holds all that is needed, except the order.'
  };
}
