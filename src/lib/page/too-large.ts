import { defaultMaxBytes } from '$lib/formats/limits';
import type { ReadResult } from '$lib/formats/types';

const megabytes = (bytes: number): string => String(Math.ceil(bytes / 104857.6) / 10);

/** The refusal of a file over the limit, said without loading it. */
export const tooLarge = (size: number): ReadResult => ({
  ok: false,
  problems: [
    {
      line: null,
      column: null,
      message: `The file has ${megabytes(size)} MB; the limit is ${megabytes(defaultMaxBytes)} MB.`,
      fix: 'Sum shots of equal count into a histogram: it holds all that is needed, except the order.'
    }
  ],
  more: 0,
  reading: {
    encoding: null,
    format: null,
    separator: null,
    header: null,
    columns: [],
    decimal: null,
    thousands: null,
    lump: null,
    rows: 0,
    blankLines: 0,
    commentLines: 0
  }
});
