import { holm } from '../multiple/holm';
import type { OpenCell } from './cell-report';
import { smallestSeen } from './smallest-seen';
import type { CellReport, Mark, VersionsOptions } from './types';

/**
 * Marks of the matrix. Rises are adjusted by Holm over all cells, other differences over all cells by themselves: each kind
 * keeps the chance of any false mark at alpha. A cell without a mark of difference "cannot tell" where a rise of the
 * tolerance would be missed more than one time in five.
 */
export function markCells(
  open: OpenCell[],
  { reference, alpha, tolerance }: Pick<VersionsOptions, 'reference' | 'alpha' | 'tolerance'>
): CellReport[] {
  const compared = open.filter((cell) => cell.rise !== null);
  const rises = holm(compared.map(({ rise }) => rise?.p ?? 1));
  const others = holm(compared.map(({ pOther }) => pOther ?? 1));
  const place = new Map(compared.map((cell, i) => [cell, i]));
  return open.map((cell) => {
    const { pOther, riseError, ...told } = cell;
    const i = place.get(cell);
    const rise = told.rise && i !== undefined ? { ...told.rise, pAdjusted: rises[i] } : null;
    const smallestRise = riseError === null ? null : smallestSeen(riseError, alpha / compared.length);
    const mark = (): Mark => {
      if (reference === null) return 'unmarked';
      if (told.version === reference) return 'reference';
      if (rise === null || smallestRise === null || i === undefined || pOther === null) return 'cannot-tell';
      if (rise.pAdjusted <= alpha) return 'risen';
      if (others[i] <= alpha) return 'differs';
      return smallestRise <= tolerance ? 'no-difference-seen' : 'cannot-tell';
    };
    return { ...told, rise, smallestRise, mark: mark() };
  });
}
