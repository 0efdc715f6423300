import { createReadStream } from 'node:fs';
import { defaultMaxBytes } from '$lib/formats/limits';
import { tooLarge } from '$lib/formats/too-large';
import { Refusal } from './exit-codes';
import { sayProblems } from './say-problems';

const reasons: Record<string, string> = {
  ENOENT: 'There is no such file.',
  EACCES: 'The file may not be read.',
  EISDIR: 'This is a folder, not a file.'
};

/**
 * Bytes of a file, or of standard input for `-`. Reading stops at the limit, so that an endless
 * pipe or device does not fill the memory.
 *
 * @throws Refusal when there is no such file, or it is too large.
 */
export async function readInput(file: string): Promise<Uint8Array> {
  const parts: Uint8Array[] = [];
  let length = 0;
  try {
    const stream: AsyncIterable<Uint8Array> = file === '-' ? process.stdin : createReadStream(file);
    for await (const part of stream) {
      parts.push(part);
      length += part.length;
      if (length > defaultMaxBytes)
        throw new Refusal(sayProblems(file, [tooLarge(null, defaultMaxBytes)], 0));
    }
  } catch (error) {
    if (error instanceof Refusal) throw error;
    const { code = '', message } = error as NodeJS.ErrnoException;
    throw new Refusal([`${file}: ${reasons[code] ?? `The file cannot be read (${message}).`}`]);
  }
  return Buffer.concat(parts);
}
