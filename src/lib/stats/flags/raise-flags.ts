import type { Flag } from '../types';
import { bunching } from './bunching';
import { bursts } from './bursts';
import { coarsening } from './coarsening';
import { deadShots } from './dead-shots';
import { drift } from './drift';
import type { Evidence } from './evidence';
import { misreads } from './misreads';
import { pairing } from './pairing';
import { regular } from './regular';

/** One line a flag, in the order they are told. */
const registry = [pairing, drift, bunching, bursts, coarsening, deadShots, misreads, regular];

/** Flags that the evidence raises, shown before hinted, remarks last. */
export function raiseFlags(evidence: Evidence): Flag[] {
  const flags = registry.map((flag) => flag(evidence)).filter((flag) => flag !== null);
  const rank = (flag: Flag) => (flag.id === 'regular' ? 2 : flag.grade === 'shown' ? 0 : 1);
  return flags.sort((a, b) => rank(a) - rank(b));
}
