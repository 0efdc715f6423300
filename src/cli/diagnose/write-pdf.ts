import { createHash } from 'node:crypto';
import { constants } from 'node:fs';
import { access, realpath, stat, writeFile } from 'node:fs/promises';
import { basename, dirname } from 'node:path';
import { documentText } from '$lib/model/document-text';
import type { Diagnosis } from '$lib/stats/types';
import { Refusal } from './exit-codes';

const reasons: Record<string, string> = {
  ENOENT: 'There is no such folder.',
  ENOTDIR: 'There is no such folder.',
  EACCES: 'The file may not be written there.',
  EROFS: 'The file may not be written there.',
  ENOSPC: 'The disk is full.'
};

const code = (error: unknown): string => (error as NodeJS.ErrnoException).code ?? '';

/**
 * Refuses a place where no PDF can go, before the counts are diagnosed: that may take minutes.
 *
 * @throws Refusal when there is no such folder, it may not be written, or the place is the input itself.
 */
export async function refusePdf(pdf: string, input: string): Promise<void> {
  try {
    await access(dirname(pdf), constants.W_OK);
  } catch (error) {
    throw new Refusal([`--pdf ${pdf}: ${reasons[code(error)] ?? 'The file cannot be written.'}`]);
  }
  const there = await stat(pdf).catch(() => null);
  if (there?.isDirectory()) throw new Refusal([`--pdf ${pdf}: This is a folder, not a file.`]);
  if (there && input !== '-' && (await realpath(pdf)) === (await realpath(input).catch(() => '')))
    throw new Refusal([`--pdf ${pdf}: This is the file of counts; give the PDF another name.`]);
}

/**
 * Writes the report as a PDF. It says nothing of when and by whom: the same counts and options give the same bytes.
 *
 * @param input the file of counts, `-` for standard input
 * @param dataset name of the dataset when the file holds several
 */
export async function writePdf(
  pdf: string,
  diagnosis: Diagnosis,
  input: string,
  dataset: string | null
): Promise<void> {
  // Its fonts and the writer are a third of the command: read only when asked for.
  const { reportPdf } = await import('$lib/server/pdf/report-pdf');
  const bytes = await reportPdf({
    document: diagnosis,
    documentSha256: createHash('sha256').update(documentText(diagnosis)).digest('hex'),
    provenance: {
      madeBy: null,
      madeAt: null,
      team: null,
      dataset: dataset ?? (input === '-' ? null : basename(input)),
      conditions: null,
      link: null
    }
  });
  try {
    await writeFile(pdf, bytes);
  } catch (error) {
    throw new Refusal([`--pdf ${pdf}: ${reasons[code(error)] ?? 'The file cannot be written.'}`]);
  }
}
