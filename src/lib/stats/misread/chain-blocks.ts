import type { Level } from '../types';
import type { Chain } from './chain-space';

/** The chain as blocks in the order of the bonds; neighbours of one level joined. */
export function chainBlocks({ p, runs }: Chain): Level[] {
  const out: Level[] = [];
  for (const { level, trials } of runs) {
    if (trials === 0) continue;
    const before = out[out.length - 1];
    if (before && before.p === p[level]) before.trials += trials;
    else out.push({ p: p[level], trials });
  }
  return out;
}
