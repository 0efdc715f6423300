import { DEMO_FILES } from '$lib/stats/demo/demo-files';
import { writeDemo } from '$lib/stats/demo/write-demo';
import { mkdirSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';

/** `npm run demo`: writes the invented data of fixtures/demo anew. A test holds the files to the generator. */
const folder = join('fixtures', 'demo');
mkdirSync(folder, { recursive: true });
for (const demo of DEMO_FILES) {
  const text = writeDemo(demo);
  writeFileSync(join(folder, `${demo.slug}.csv`), text);
  console.log(`${folder}/${demo.slug}.csv  ${text.length} bytes`);
}
