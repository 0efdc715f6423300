import { createHash } from 'node:crypto';
import { ARCHIVE_PATH, manifestSchema, type Manifest } from '$lib/model/team/transfer/archive-schema';
import { LIMITS } from './limits';
import { parseJson } from './parse-json';
import { BadZip, readZip } from './read-zip';

export type OpenArchive =
  { ok: true; manifest: Manifest; files: Map<string, Uint8Array>; sha256: string } | ArchiveRefusal;

export interface ArchiveRefusal {
  ok: false;
  /**
   * `not-a-zip`; `too-large`: it would unpack to more than may be held; `not-an-archive`: a zip of something else, or
   * of a later version; `damaged`: a file is missing, added or changed; `bad-file`: one does not say what it must.
   */
  reason: 'not-a-zip' | 'too-large' | 'not-an-archive' | 'damaged' | 'bad-file';
  /** Which file and why, in words. */
  what: string;
}

class Refused extends Error {
  constructor(readonly refusal: ArchiveRefusal) {
    super(refusal.what);
  }
}

const refuse = (reason: ArchiveRefusal['reason'], what: string): never => {
  throw new Refused({ ok: false, reason, what });
};

/**
 * Unpacks a team's archive and checks every file against its manifest. Sizes are those that the archive claims, and
 * are checked before anything is unpacked; `readZip` sees to it that no file unpacks to more than was claimed of it.
 * Paths are looked up in a short list and used for nothing else.
 */
export function openArchive(bytes: Uint8Array): OpenArchive {
  try {
    const files = unpack(bytes);
    const manifest = readManifest(files);
    check(manifest, files);
    return { ok: true, manifest, files, sha256: sha256(bytes) };
  } catch (error) {
    if (error instanceof Refused) return error.refusal;
    if (error instanceof BadZip) return { ok: false, reason: 'damaged', what: error.message };
    return { ok: false, reason: 'not-a-zip', what: 'It is no zip file, or a part of one.' };
  }
}

function unpack(bytes: Uint8Array): Map<string, Uint8Array> {
  // A directory is found from the end, and reads as one when the beginning was cut off.
  if (bytes[0] !== 0x50 || bytes[1] !== 0x4b) throw new Error('no zip');
  const seen = new Set<string>();
  let total = 0;
  return readZip(bytes, ({ name, size, originalSize }) => {
    if (seen.size >= LIMITS.entries) refuse('too-large', `It holds more than ${LIMITS.entries} files.`);
    if (!ARCHIVE_PATH.test(name)) refuse('not-an-archive', `It holds “${shownName(name)}”.`);
    if (seen.has(name)) refuse('damaged', `It holds ${name} twice.`);
    seen.add(name);
    total += originalSize;
    if (originalSize > LIMITS.file) refuse('too-large', `${name} unpacks to ${originalSize} bytes.`);
    if (total > LIMITS.total) refuse('too-large', `Its files unpack to more than ${LIMITS.total} bytes.`);
    if (originalSize > LIMITS.ratioFrom && originalSize > size * LIMITS.ratio)
      refuse('too-large', `${name} is packed more than ${LIMITS.ratio} to one.`);
  });
}

/** A name from outside within a sentence: no control signs, none that turn the direction of writing. */
const shownName = (name: string) => name.replace(/[\p{Cc}\p{Cf}\p{Cs}]/gu, '\ufffd').slice(0, 80);

function readManifest(files: Map<string, Uint8Array>): Manifest {
  const bytes = files.get('manifest.json');
  if (!bytes) return refuse('not-an-archive', 'It has no manifest.json.');
  const read = manifestSchema.safeParse(parseJson(bytes));
  if (!read.success)
    return refuse('not-an-archive', 'Its manifest.json is not one of an archive severalty.team/1.');
  return read.data;
}

function check(manifest: Manifest, files: Map<string, Uint8Array>): void {
  const listed = new Set(['manifest.json']);
  for (const { path, size, sha256: sum } of manifest.files) {
    if (listed.has(path)) refuse('damaged', `The manifest lists ${path} twice.`);
    listed.add(path);
    const bytes = files.get(path);
    if (!bytes) return refuse('damaged', `${path} is missing.`);
    if (bytes.length !== size || sha256(bytes) !== sum)
      refuse('damaged', `${path} is not as the manifest lists it.`);
  }
  for (const path of files.keys())
    if (!listed.has(path)) refuse('damaged', `${path} is not in the manifest.`);
}

const sha256 = (bytes: Uint8Array) => createHash('sha256').update(bytes).digest('hex');
