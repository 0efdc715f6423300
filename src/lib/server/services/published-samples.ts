import type { CatalogueEntry } from './sample-catalogue';

/** Published counts, as printed. */
export const PUBLISHED: CatalogueEntry[] = [];
