import { oneCrosstalkingPair } from '../../../stats/demo/one-crosstalking-pair';
import type { Database } from '../../db/client';
import type { Actor } from '../access/actor';
import { enqueueJobs } from '../jobs/enqueue-jobs';
import { readSiteMap } from '../site-maps/read-site-map';
import { saveSiteMap } from '../site-maps/save-site-map';

/** The invented team's map of sites, one crosstalking pair of 64; the counts of its shots are diagnosed like any other. */
export function seedDemoMap(db: Database, actor: Actor, now: number): void {
  const saved = saveSiteMap(
    db,
    actor,
    {
      fileName: 'one-pair.txt',
      bytes: new TextEncoder().encode(oneCrosstalkingPair()),
      name: 'Wrack, invented: one pair of 64',
      options: { geometry: 'chain', alpha: 0.05, seek: 'rise' },
      device: null,
      firmware: null,
      group: null,
      keepsKinks: false
    },
    now
  );
  if (!saved.ok) throw new Error(`The map of the demo team could not be made: ${saved.reason}.`);
  const read = readSiteMap(db, actor, saved.id);
  if (read.ok && read.map.countsDataset !== null) enqueueJobs(db, actor, [read.map.countsDataset], {}, now);
}
