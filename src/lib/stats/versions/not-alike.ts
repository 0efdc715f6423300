import type { Hindrance, VersionCell } from './types';

/** Why two cells cannot be held against each other: N known on one side only, another unit or geometry. Empty when they can. */
export function notAlike(a: VersionCell, b: VersionCell): Hindrance[] {
  const found: Hindrance[] = [];
  if ((a.trials === null) !== (b.trials === null)) found.push('trials-differ');
  if (a.unit !== b.unit) found.push('unit-differs');
  if (a.geometry !== b.geometry) found.push('geometry-differs');
  return found;
}
