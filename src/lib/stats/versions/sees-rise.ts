import type { CellReport } from './types';

/** Whether a rise of the tolerance over the reference would be seen in a cell with 80 % power. */
export const seesRise = ({ smallestRise }: Pick<CellReport, 'smallestRise'>, tolerance: number): boolean =>
  smallestRise !== null && smallestRise <= tolerance;
