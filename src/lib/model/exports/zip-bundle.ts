import { zipSync, type Zippable } from 'fflate';
import type { Bundle } from './bundle-files';

/** The same for every file, so that the same bundle has the same bytes; zip knows no year before 1980. */
const DATE = new Date(1980, 0, 1, 12);

/** A bundle as a zip; the same bundle gives the same bytes. */
export function zipBundle({ folder, files }: Bundle): Uint8Array<ArrayBuffer> {
  const entries: Zippable = {};
  for (const [path, bytes] of files) entries[`${folder}/${path}`] = [bytes, { mtime: DATE, level: 6 }];
  return zipSync(entries);
}
