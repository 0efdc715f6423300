import { climb, type Climb } from './climb';
import { moves } from './moves';
import { transfers } from './transfers';
import type { TrialLevels } from './trial-levels';
import type { Workspace } from './workspace';

/** How thorough a search is, in nats. */
export interface Effort {
  /** A climb ends when its next step promises less. */
  enough: number;
  /** Structural moves that promise or bring less are not made. */
  worth: number;
  /** Rounds of structural moves at most. */
  rounds: number;
  /** Most trials passed between levels at a time when no other move pays; 0 for none. */
  transfers: number;
}

/** Climbs from a start, then makes the structural moves that pay until none does, or the value is `settled`. */
export function search(space: Workspace, start: TrialLevels, effort: Effort, settled = Infinity): Climb {
  let best = climb(space, start, effort.enough, -Infinity, settled);
  // A sum over 2^50 shots is rounded at about one nat: gains under that are no gains.
  const noise = Number.isFinite(best.value) ? 1e-14 * Math.abs(best.value) : 0;
  const sighted = { ...effort, enough: effort.enough + noise, worth: effort.worth + noise };
  for (let round = 0; round < effort.rounds && !(best.value >= settled); round++) {
    const next = improved(space, best, sighted, settled);
    if (!next) break;
    best = next;
  }
  return best;
}

function improved(space: Workspace, best: Climb, effort: Effort, settled: number): Climb | null {
  for (const move of moves(space, best.levels, effort.worth)) {
    const found = bestOf(space, move.starts, effort, best.value, settled);
    if (found && found.value > best.value + effort.worth / 2) return found;
  }
  for (let size = Math.min(effort.transfers, largestTransfer(best.levels)); size >= 1; size = size >> 2) {
    const found = bestOf(space, transfers(best.levels, size), effort, best.value, settled);
    if (found && found.value > best.value + effort.worth) return found;
  }
  return null;
}

function bestOf(
  space: Workspace,
  starts: TrialLevels[],
  effort: Effort,
  bar: number,
  settled: number
): Climb | null {
  let best: Climb | null = null;
  for (const start of starts) {
    const found = climb(space, start, effort.enough, Math.max(bar, best?.value ?? bar), settled);
    if (!best || found.value > best.value) best = found;
    if (found.value >= settled) break;
  }
  return best;
}

/** An eighth of the largest level, as a power of 4: large laws would otherwise crawl one trial at a time. */
function largestTransfer(levels: TrialLevels): number {
  const most = Math.max(levels.ones, ...levels.trials) / 8;
  return most < 4 ? 1 : 4 ** Math.floor(Math.log(most) / Math.log(4));
}
