import { readCounts } from '$lib/formats/read-counts';
import { documentText } from '$lib/model/document-text';
import { defaultOptions } from '$lib/stats/default-options';
import type { DemoFile } from '$lib/stats/demo/demo-file';
import { writeDemo } from '$lib/stats/demo/write-demo';
import { diagnose } from '$lib/stats/diagnose';

/**
 * The document of one demo file, as the guide shows it: its bytes are read as a dropped file is, and diagnosed with
 * the options of a fresh page and what the file says of the experiment.
 */
export async function guideDocument(demo: DemoFile): Promise<string> {
  const { trials, unit, geometry } = demo;
  const read = readCounts(new TextEncoder().encode(writeDemo(demo)));
  if (!read.ok) throw new Error(`The demo file ${demo.slug} cannot be read.`);
  return documentText(await diagnose(read.datasets[0].data, { ...defaultOptions, trials, unit, geometry }));
}
