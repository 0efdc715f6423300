import { basename } from 'node:path';
import { chartFiles } from '$lib/charts/chart-files';
import type { Dataset } from '$lib/formats/types';
import { documentText } from '$lib/model/document-text';
import { bundleFiles } from '$lib/model/exports/bundle-files';
import { fileSha256 } from '$lib/model/exports/file-sha256';
import { zipBundle } from '$lib/model/exports/zip-bundle';
import { writeReport } from '$lib/server/pdf/write-report';
import { safeFileName } from '$lib/server/services/datasets/safe-file-name';
import type { Diagnosis } from '$lib/stats/types';
import type { Output } from './write-output';

/** What the command has at hand once it has diagnosed. */
export interface Done {
  diagnosis: Diagnosis;
  dataset: Dataset;
  supplied: number[] | null;
  /** The file of counts, `-` for standard input, and its bytes. */
  file: string;
  bytes: Uint8Array;
  /** Name of the dataset when the file holds several. */
  several: string | null;
}

/**
 * The files asked for, each with its bytes. They say nothing of when and by whom: the same counts and options give the
 * same bytes. Its fonts and the writers are half of the command, so it is loaded only when a file is asked for.
 */
export async function makeFiles(done: Done, outputs: Output[]): Promise<[Output, Uint8Array][]> {
  const { diagnosis, file, several } = done;
  const name = several ?? (file === '-' ? null : basename(file));
  const pdf = await writeReport({
    document: diagnosis,
    documentSha256: fileSha256(new TextEncoder().encode(documentText(diagnosis))),
    provenance: { madeBy: null, madeAt: null, team: null, dataset: name, conditions: null, link: null }
  });
  return outputs.map((output) => [output, output.option === '--pdf' ? pdf : bundleOf(done, name, pdf)]);
}

function bundleOf(done: Done, name: string | null, pdf: Uint8Array): Uint8Array {
  const { diagnosis, dataset, supplied, file, bytes, several } = done;
  const { conditions, data } = dataset;
  return zipBundle(
    bundleFiles({
      document: diagnosis,
      documentText: documentText(diagnosis),
      data,
      supplied,
      about: name === null ? [] : [`Made from ${several === null ? 'the file' : 'the dataset'} ${name}.`],
      conditions: Object.keys(conditions).length > 0 ? conditions : null,
      pdf,
      charts: chartFiles(diagnosis, name),
      // A file with several datasets holds more than this report is about.
      original: several === null && file !== '-' ? { name: safeFileName(basename(file)), bytes } : null
    })
  );
}
