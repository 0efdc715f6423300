import { bareConditions } from '../../../model/team/datasets/conditions';
import { siteCounts } from '../../../stats/sites/site-counts';
import type { SitesInput } from '../../../stats/sites/sites-types';
import type { Geometry } from '../../../stats/types';
import type { Database } from '../../db/client';
import { newId } from '../../db/new-id';
import { dataset } from '../../db/schema';
import type { Actor } from '../access/actor';
import { scriptOf } from '../access/script-of';
import { countFacts } from '../datasets/count-facts';
import { nameDevice } from '../devices/name-device';
import { recordEvent } from '../events/record-event';
import type { SiteMapRequest } from './site-map-request';

/**
 * Saves what is counted in site-resolved shots as a dataset like any other, a shot list in its order: excited sites, or
 * kinks between neighbours.
 *
 * @returns its id
 */
export function insertSiteCounts(
  tx: Pick<Database, 'select' | 'insert'>,
  actor: Actor,
  asked: Pick<SiteMapRequest, 'name' | 'device' | 'firmware' | 'group'> & { fileId: string },
  { names, shots }: SitesInput,
  geometry: Geometry,
  now: number
): string {
  const sites = names.length;
  const facts = countFacts(siteCounts(shots, sites, geometry));
  const part = geometry === 'sites' ? 'excited sites' : 'kinks';
  const name = `${asked.name}, ${part}`;
  const id = newId();
  tx.insert(dataset)
    .values({
      ...bareConditions(name),
      id,
      teamId: actor.teamId,
      fileId: asked.fileId,
      reading: '{}',
      part,
      device: asked.device,
      firmware: asked.firmware,
      group: asked.group,
      geometry,
      trials: geometry === 'open-bonds' ? sites - 1 : sites,
      trialsWhy:
        geometry === 'sites'
          ? 'Sites in each shot of the file.'
          : 'Pairs of neighbours among the sites of the file.',
      counts: facts.text,
      kind: facts.kind,
      digest: facts.digest,
      shots: facts.shots,
      mean: facts.mean,
      largest: facts.largest,
      createdBy: actor.personId,
      createdAt: now,
      updatedAt: now
    })
    .run();
  const { device, firmware } = asked;
  nameDevice(tx, { teamId: actor.teamId, createdBy: actor.personId, device, firmware }, now);
  const happening = { teamId: actor.teamId, personId: actor.personId, thing: id };
  recordEvent(tx, { ...happening, action: 'dataset.upload', detail: { name, ...scriptOf(actor) } }, now);
  return id;
}
