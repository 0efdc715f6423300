import type { ShotList } from '../types';

/** What counts are derived: excited sites, or kinks between neighbours on an open chain or a ring. */
type Derived = 'sites' | 'open-bonds' | 'ring-bonds';

/**
 * Count of each shot, order kept, from its sites in their order along the chain.
 *
 * `sites`: sites that read 1, at most N. `open-bonds`: neighbours i, i+1 that differ, at most N − 1. `ring-bonds`:
 * the same and the last against the first, at most N; even on every shot, since a closed walk changes value an even
 * number of times. A ring of two sites would count its one bond twice and is refused.
 *
 * @param shots packed rows: site i is bit i mod 8, lowest first, of byte ⌊i/8⌋
 * @param sites N, a whole number ≥ 2
 * @throws RangeError when N is below 2, or below 3 on a ring
 */
export function siteCounts(shots: Uint8Array[], sites: number, geometry: Derived): ShotList {
  const least = geometry === 'ring-bonds' ? 3 : 2;
  if (!Number.isInteger(sites) || sites < least) throw new RangeError(`${sites} sites for ${geometry}`);
  const bit = (row: Uint8Array, site: number) => (row[site >> 3] >> (site & 7)) & 1;
  const counts = new Uint32Array(shots.length);
  for (const [shot, row] of shots.entries()) {
    let count = 0;
    for (let site = 0; site < sites; site++) {
      if (geometry === 'sites') count += bit(row, site);
      else if (site + 1 < sites) count += bit(row, site) ^ bit(row, site + 1);
      else if (geometry === 'ring-bonds') count += bit(row, site) ^ bit(row, 0);
    }
    counts[shot] = count;
  }
  return { kind: 'shots', shots: counts, batches: null };
}
