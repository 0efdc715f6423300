import { weighedJson } from '../../../model/weighed-json';

/**
 * Heaviest file of an archive: a histogram of two million lines. Its lists are read by `listOf`, which tells one misfit.
 */
export const ARCHIVE_WEIGHT = 24_000_000;

/** The value of a JSON file in UTF-8; undefined when it is none, or heavier than any that is written. */
export function parseJson(bytes: Uint8Array, most = ARCHIVE_WEIGHT): unknown {
  // We write no mark of order, and a file that gained one is not ours.
  if (bytes[0] === 0xef) return undefined;
  const read = weighedJson(bytes, most);
  return read.ok ? read.value : undefined;
}
