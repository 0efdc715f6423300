import { generator } from '../random/generator';
import type { DemoFile } from './demo-file';

/**
 * The bytes of one demo file: remarks that say that it is invented, from which seed and for which cause, then
 * its rows. The same for every run, so a test can compare it with the committed file.
 */
export function writeDemo(demo: DemoFile): string {
  const remarks = [
    `Invented data, seed ${demo.seed}. No such laboratory, device or firmware exists.`,
    demo.about,
    `Cause: ${demo.cause}`
  ];
  const rows = demo.rows((stream) => generator(demo.seed, stream));
  return [...remarks.map((line) => `# ${line}`), ...rows].join('\n') + '\n';
}
