import { constants } from 'node:fs';
import { access, realpath, stat, writeFile } from 'node:fs/promises';
import { dirname } from 'node:path';
import { Refusal } from '../shared/exit-codes';

/** An option that names a file to write, and the file. */
export interface Output {
  option: '--pdf' | '--bundle';
  path: string;
}

const reasons: Record<string, string> = {
  ENOENT: 'There is no such folder.',
  ENOTDIR: 'There is no such folder.',
  EACCES: 'The file may not be written there.',
  EROFS: 'The file may not be written there.',
  ENOSPC: 'The disk is full.'
};

const names = { '--pdf': 'PDF', '--bundle': 'zip' } as const;

const code = (error: unknown): string => (error as NodeJS.ErrnoException).code ?? '';

/**
 * Refuses a place where no file can go, before the counts are diagnosed: that may take minutes.
 *
 * @throws Refusal when there is no such folder, it may not be written, or the place is the input itself.
 */
export async function refuseOutput({ option, path }: Output, input: string): Promise<void> {
  try {
    await access(dirname(path), constants.W_OK);
  } catch (error) {
    throw new Refusal([`${option} ${path}: ${reasons[code(error)] ?? 'The file cannot be written.'}`]);
  }
  const there = await stat(path).catch(() => null);
  if (there?.isDirectory()) throw new Refusal([`${option} ${path}: This is a folder, not a file.`]);
  if (there && input !== '-' && (await realpath(path)) === (await realpath(input).catch(() => '')))
    throw new Refusal([
      `${option} ${path}: This is the file of counts; give the ${names[option]} another name.`
    ]);
}

/** @throws Refusal when the file cannot be written after all. */
export async function writeOutput({ option, path }: Output, bytes: Uint8Array): Promise<void> {
  try {
    await writeFile(path, bytes);
  } catch (error) {
    throw new Refusal([`${option} ${path}: ${reasons[code(error)] ?? 'The file cannot be written.'}`]);
  }
}
