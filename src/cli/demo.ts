import { DEMO_FILES } from '$lib/stats/demo/demo-files';
import { firmwareFiles } from '$lib/stats/demo/firmware-files';
import { GUIDE_CASES } from '$lib/stats/demo/guide-cases';
import { oneCrosstalkingPair } from '$lib/stats/demo/one-crosstalking-pair';
import { writeDemo } from '$lib/stats/demo/write-demo';
import { mkdirSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { guideDocument } from './demo/guide-document';

/**
 * `npm run demo`: writes the invented data of fixtures/demo anew, and the documents that the guide shows of some of
 * them; and the invented shots of fixtures/sites and histograms of fixtures/firmware. Tests hold both to the generator and the engine.
 */
function write(folder: string, name: string, text: string): void {
  mkdirSync(folder, { recursive: true });
  writeFileSync(join(folder, name), text);
  console.log(`${folder}/${name}  ${text.length} bytes`);
}

for (const demo of DEMO_FILES) write(join('fixtures', 'demo'), `${demo.slug}.csv`, writeDemo(demo));
for (const demo of GUIDE_CASES)
  write(join('fixtures', 'guide'), `${demo.slug}.json`, await guideDocument(demo));
write(join('fixtures', 'sites'), 'one-pair.txt', oneCrosstalkingPair());
for (const { name, text } of firmwareFiles()) write(join('fixtures', 'firmware'), name, text);
