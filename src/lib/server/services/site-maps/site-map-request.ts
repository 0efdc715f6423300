import type { SitesOptions } from '../../../stats/sites/sites-types';

/** A file of site-resolved shots and what is said about it. */
export interface SiteMapRequest {
  /** Of the file. */
  fileName: string;
  bytes: Uint8Array;
  name: string;
  options: SitesOptions;
  device: string | null;
  firmware: string | null;
  group: string | null;
  /** Whether kinks between neighbours are kept as a dataset of their own, beside the counts of excited sites. */
  keepsKinks: boolean;
}
