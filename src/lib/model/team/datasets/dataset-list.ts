import type { Geometry, Unit, Verdict } from '../../../stats/types';

/** One line of the table of datasets. */
export interface DatasetRow {
  id: string;
  name: string;
  device: string | null;
  firmware: string | null;
  group: string | null;
  quenchTime: number | null;
  quenchUnit: string | null;
  geometry: Geometry;
  unit: Unit;
  trials: number | null;
  shots: number;
  mean: number;
  largest: number;
  /** YYYY-MM-DD. */
  measuredOn: string | null;
  /** Milliseconds since 1970. */
  createdAt: number;
  /** Name of who saved it; null when that person is gone. */
  by: string | null;
  /** Reports that are not put aside. */
  reports: number;
  /** Of the newest of them. */
  verdict: Verdict | null;
}

/** One page of the table. */
export interface DatasetList {
  rows: DatasetRow[];
  /** Datasets that the filters leave, over all pages. */
  total: number;
  /** Datasets of the team, whatever the filters say. */
  all: number;
  page: number;
  size: number;
}

/** What the filters can be set to. */
export interface DatasetFacets {
  devices: string[];
  firmwares: string[];
  groups: string[];
  people: { id: string; name: string }[];
}
