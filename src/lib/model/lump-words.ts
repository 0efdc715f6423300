/** Which rows of a table lump counts. */
export interface Lumps {
  /** The last: "10 or more". */
  above: boolean;
  /** The first: "2 or fewer". */
  below: boolean;
}

/** The lumps of a document's data. */
export const lumpsOf = (data: { lump: unknown; below?: unknown }): Lumps => ({
  above: data.lump !== null,
  below: data.below !== undefined
});

/** "The last row lumps counts", and what that makes of mean and variance; for a table that has such a row. */
export function lumpWords({ above, below }: Lumps): { rows: string; limits: string } {
  if (above && below)
    return {
      rows: 'The first and the last row lump counts',
      limits: 'the variance is a lower limit and the mean may err to either side'
    };
  return below
    ? {
        rows: 'The first row lumps counts',
        limits: 'the variance is a lower limit and the mean an upper one'
      }
    : { rows: 'The last row lumps counts', limits: 'mean and variance are lower limits' };
}
