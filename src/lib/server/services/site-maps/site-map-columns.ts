import { sql } from 'drizzle-orm';
import type { Seek } from '../../../stats/sites/pair-tests';
import { siteMap } from '../../db/schema';

/** What a list says of a map of sites. */
export const siteMapColumns = {
  id: siteMap.id,
  name: siteMap.name,
  geometry: siteMap.geometry,
  seek: sql<Seek>`json_extract(${siteMap.document}, '$.seek')`,
  alpha: siteMap.alpha,
  sites: siteMap.sites,
  shots: siteMap.shots,
  device: siteMap.device,
  firmware: siteMap.firmware,
  group: siteMap.group,
  statement: sql<string>`json_extract(${siteMap.document}, '$.statement')`,
  countsDataset: siteMap.countsId,
  kinksDataset: siteMap.kinksId,
  createdAt: siteMap.createdAt
};

export interface SiteMapEntry {
  id: string;
  name: string;
  geometry: 'chain' | 'ring';
  seek: Seek;
  alpha: number;
  sites: number;
  shots: number;
  device: string | null;
  firmware: string | null;
  group: string | null;
  statement: string;
  /** Null once that dataset is removed. */
  countsDataset: string | null;
  kinksDataset: string | null;
  createdAt: number;
}
