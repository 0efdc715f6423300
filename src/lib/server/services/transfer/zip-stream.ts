import { deflateSync, Zip, ZipDeflate, ZipPassThrough } from 'fflate';
import { createHash } from 'node:crypto';
import type { Manifest } from '$lib/model/team/transfer/archive-schema';
import { jsonBytes } from './json-bytes';
import { LIMITS } from './limits';

export interface Entry {
  path: string;
  /** Called when its turn comes, so that large files are not all in memory at once. */
  bytes: () => Uint8Array;
}

/** The same for every file: what says when an archive was made is its manifest. (Zip has no year before 1980.) */
const DATE = new Date(1980, 0, 1, 12);

/**
 * A zip of the entries as a stream, closed by manifest.json with the size and sha256 of each. One file a pull: a slow
 * reader slows it down, and other requests get their turn between two files.
 */
export function zipStream(
  entries: Iterable<Entry>,
  about: Omit<Manifest, 'files'>
): ReadableStream<Uint8Array> {
  const waiting = entries[Symbol.iterator]();
  const files: Manifest['files'] = [];
  let zip: Zip;
  const add = (path: string, bytes: Uint8Array) => {
    const file = packsTooWell(bytes) ? new ZipPassThrough(path) : new ZipDeflate(path, { level: 6 });
    file.mtime = DATE;
    zip.add(file);
    file.push(bytes, true);
  };
  return new ReadableStream<Uint8Array>(
    {
      start(controller) {
        zip = new Zip((error, chunk, last) => {
          if (error) return controller.error(error);
          controller.enqueue(chunk);
          if (last) controller.close();
        });
      },
      async pull() {
        await new Promise((resolve) => setImmediate(resolve));
        const { value, done } = waiting.next();
        if (done) {
          add('manifest.json', jsonBytes({ ...about, files } satisfies Manifest));
          zip.end();
          return;
        }
        const bytes = value.bytes();
        const sha256 = createHash('sha256').update(bytes).digest('hex');
        files.push({ path: value.path, size: bytes.length, sha256 });
        add(value.path, bytes);
      },
      cancel() {
        zip.terminate();
      }
    },
    { highWaterMark: 1 }
  );
}

/** A long run of zeros is an honest file, and looks like a bomb: whoever opens the archive would refuse it. */
function packsTooWell(bytes: Uint8Array): boolean {
  return bytes.length > LIMITS.ratioFrom && bytes.length / deflateSync(bytes).length > LIMITS.ratio * 0.9;
}
