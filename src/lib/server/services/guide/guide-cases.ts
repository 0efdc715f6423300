import { readCounts } from '$lib/formats/read-counts';
import { defaultOptions } from '$lib/stats/default-options';
import { GUIDE_CASES } from '$lib/stats/demo/guide-cases';
import { writeDemo } from '$lib/stats/demo/write-demo';
import type { CountData, DiagnoseOptions, Diagnosis } from '$lib/stats/types';
import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { projectFolder } from '../../project-folder';

export interface GuideCase {
  slug: string;
  title: string;
  about: string;
  cause: string;
  diagnosis: Diagnosis;
  /** What opens the same on the first page. */
  data: CountData;
  options: DiagnoseOptions;
}

let kept: GuideCase[] | null = null;

/**
 * The invented datasets of the guide with their documents, as `npm run demo` wrote them. Nothing is computed here;
 * files of the application do not change while it runs, so they are read once.
 *
 * @throws when a document is missing
 */
export function guideCases(folder = join(projectFolder(), 'fixtures', 'guide')): GuideCase[] {
  kept ??= GUIDE_CASES.map((demo) => {
    const { slug, title, about, cause, trials, unit, geometry } = demo;
    const read = readCounts(new TextEncoder().encode(writeDemo(demo)));
    if (!read.ok) throw new Error(`The demo file ${slug} cannot be read.`);
    return {
      slug,
      title,
      about,
      cause,
      diagnosis: JSON.parse(readFileSync(join(folder, `${slug}.json`), 'utf8')) as Diagnosis,
      data: read.datasets[0].data,
      options: { ...defaultOptions, trials, unit, geometry }
    };
  });
  return kept;
}
