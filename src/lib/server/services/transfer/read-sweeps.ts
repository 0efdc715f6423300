import { createHash } from 'node:crypto';
import { sweepDocumentSchema } from '$lib/model/api/shapes/sweep-document';
import { sweepsFileSchema, type SweepsFile } from '$lib/model/team/transfer/archive-schema';
import { ARCHIVE_WEIGHT } from './parse-json';
import { bad, readEntry } from './read-entry';

export interface ReadArchivedSweep {
  about: SweepsFile[number];
  text: string;
}

/**
 * The sweeps of an archive: each document of the sum that is told of it, and made of just the datasets, by their digests,
 * that are told beside it. An archive made before sweeps were carried has none.
 */
export function readSweeps(files: Map<string, Uint8Array>): ReadArchivedSweep[] {
  if (!files.has('sweeps.json')) return [];
  return readEntry(files, 'sweeps.json', sweepsFileSchema, ARCHIVE_WEIGHT).map((about) => {
    const document = readEntry(files, about.file, sweepDocumentSchema);
    const text = new TextDecoder('utf-8', { ignoreBOM: true }).decode(files.get(about.file));
    if (createHash('sha256').update(text).digest('hex') !== about.sha256)
      bad(`${about.file} is not the document of that sum.`);
    const told = new Map(about.datasets.map(({ id, digest }) => [id, digest]));
    for (const { label, dataset } of document.points)
      if (!dataset || told.get(dataset.id) !== dataset.digest)
        bad(`${about.file}: “${label}” is no dataset of that digest in sweeps.json.`);
    return { about, text };
  });
}
