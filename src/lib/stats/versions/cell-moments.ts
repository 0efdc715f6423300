import { inUnits } from '../input/in-units';
import { BadInput } from '../types';
import type { VersionCounts } from './dispersion-rise';
import { logDispersion, type LogDispersion } from './log-dispersion';
import type { Hindrance, VersionCell } from './types';

/** A cell as the tests take it: its counts in its unit and their moments, or what stands in the way. */
export interface CellMoments {
  shots: number;
  /** Null with a hindrance. */
  known: { counts: VersionCounts; moments: LogDispersion } | null;
  hindrances: Hindrance[];
}

/**
 * Moments of a cell, where its counts tell them: lumped counts hide the variance, a declared cut and misread bonds change
 * the ceiling, kinks of a ring counted one by one have twice the variance of their pairs, and equal counts have no spread. Misread sites stay independent trials, so that rate needs no ceiling of
 * its own. A cell with no shots is hindered by `no-counts`, odd counts or more counts than N by `odd-pairs`.
 */
export function cellMoments(cell: VersionCell): CellMoments {
  const { lump, below, counts } = cell.histogram;
  const shots = counts.reduce((sum, [, seen]) => sum + seen, 0) + (lump?.shots ?? 0) + (below?.shots ?? 0);
  const stop = (hindrance: Hindrance): CellMoments => ({ shots, known: null, hindrances: [hindrance] });
  if (shots === 0) return stop('no-counts');
  if (lump?.shots || below?.shots) return stop('lumped');
  if (cell.kept && (cell.kept.from > 0 || cell.kept.to !== null)) return stop('cut');
  if (cell.misread && cell.geometry !== 'sites') return stop('misread-bonds');
  if (cell.geometry === 'ring-bonds' && cell.unit === 'defect') return stop('ring-in-defects');
  const taken = taking(cell);
  if (!taken) return stop('odd-pairs');
  const moments = logDispersion(taken);
  if (!(Number.isFinite(moments.log) && Number.isFinite(moments.error))) return stop('no-spread');
  return { shots, known: { counts: taken, moments }, hindrances: [] };
}

function taking({ histogram, trials, unit }: VersionCell): VersionCounts | null {
  const seen = { ...histogram, lump: null, below: null, counts: histogram.counts.filter(([, h]) => h > 0) };
  try {
    const { histogram, trials: number } = inUnits(seen, trials, unit);
    return { counts: histogram.counts, trials: number };
  } catch (error) {
    if (error instanceof BadInput) return null;
    throw error;
  }
}
