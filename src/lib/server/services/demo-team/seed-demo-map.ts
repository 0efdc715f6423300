import { oneCrosstalkingPair } from '../../../stats/demo/one-crosstalking-pair';
import type { Database } from '../../db/client';
import type { Actor } from '../access/actor';
import { enqueueJobs } from '../jobs/enqueue-jobs';
import { readSiteMap } from '../site-maps/read-site-map';
import { saveSiteMap } from '../site-maps/save-site-map';

/**
 * Two maps of the invented team, to be compared: 64 sites without crosstalk, and with one crosstalking pair. The counts of
 * their shots are diagnosed like any other.
 */
export function seedDemoMap(db: Database, actor: Actor, now: number): void {
  seedOne(
    db,
    actor,
    { name: 'Wrack, invented: before, no pair', fileName: 'no-pair.txt' },
    oneCrosstalkingPair(200, 2),
    now
  );
  seedOne(
    db,
    actor,
    { name: 'Wrack, invented: one pair of 64', fileName: 'one-pair.txt' },
    oneCrosstalkingPair(),
    now + 1
  );
}

function seedOne(
  db: Database,
  actor: Actor,
  named: { name: string; fileName: string },
  text: string,
  now: number
): void {
  const saved = saveSiteMap(
    db,
    actor,
    {
      ...named,
      bytes: new TextEncoder().encode(text),
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
