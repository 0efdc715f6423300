import type { Verdict } from '../../../stats/types';

/** What measured one group of a device under one firmware version. */
export interface DeviceCell {
  firmware: string;
  /** Null for the whole device. */
  group: string | null;
  /** The newest dataset that is not put aside: it stands for the cell. */
  dataset: { id: string; name: string; shots: number; mean: number; createdAt: number };
  /** Newest report of it; null where it was not diagnosed yet. */
  report: { id: string; verdict: Verdict } | null;
  /** Whether a diagnosis of it waits or runs. */
  waits: boolean;
  /** Older datasets of the same cell, newest first: they no longer count. */
  superseded: { id: string; name: string }[];
}

/** What a group is called; datasets without one measured the device as a whole. */
export const sayGroup = (group: string | null): string => group ?? 'whole device';
