import type { SitesReport } from '$lib/stats/sites/sites-types';
import { packRows, unpackRows, type PackedRows } from './packed-rows';

/** Pairs of a map below which packing saves nothing. */
const LONG = 200;

/** A map of sites on its way from server to page, its pairs as columns. */
export interface PackedMap {
  packedMap: object;
}

/** A map with many pairs, packed for the way to the page; false for anything else, which goes as it is. */
export function packMap(value: unknown): PackedMap | false {
  const map = value as Partial<SitesReport> | null;
  if (typeof value !== 'object' || map?.format !== 'severalty.sites/1') return false;
  if (!Array.isArray(map.pairs) || map.pairs.length < LONG) return false;
  return { packedMap: { ...map, pairs: packRows(map.pairs) } };
}

/** The map again: the same values in the same order. */
export function unpackMap({ packedMap }: PackedMap): SitesReport {
  const map = packedMap as SitesReport;
  return { ...map, pairs: unpackRows(map.pairs as unknown as PackedRows) } as SitesReport;
}
