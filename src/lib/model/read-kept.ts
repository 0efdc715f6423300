import type { DiagnoseOptions } from '$lib/stats/types';

type Kept = NonNullable<DiagnoseOptions['kept']>;

/** "0-4" as the counts from 0 to 4, "1-" as those from 1 up, with any dash; null for anything else. */
export function readKept(typed: string): Kept | null {
  const found = /^\s*(\d{1,15})\s*[-\u2010-\u2015\u2212]\s*(\d{1,15})?\s*$/.exec(typed);
  return found ? { from: Number(found[1]), to: found[2] === undefined ? null : Number(found[2]) } : null;
}

/** What readKept reads. */
export const writeKept = ({ from, to }: Kept): string => `${from}-${to ?? ''}`;
