import { DEMO_FILES } from '$lib/stats/demo/demo-files';
import { PUBLISHED } from './published-samples';
import type { Sample } from './samples';

/** A sample without its text; `file` is relative to fixtures/. */
export type CatalogueEntry = Omit<Sample, 'id' | 'fileName' | 'text' | 'order'> & { file: string };

/** The shipped samples in the order of the list: invented ones with known causes, then published ones. */
export const CATALOGUE: CatalogueEntry[] = [
  ...DEMO_FILES.map(({ slug, title, about, cause, trials, unit, geometry, seed }) => ({
    slug,
    title,
    about,
    cause,
    source: `Invented; made by this application's own generator with seed ${seed}.`,
    invented: true,
    trials,
    unit,
    geometry,
    file: `demo/${slug}.csv`
  })),
  ...PUBLISHED
];
