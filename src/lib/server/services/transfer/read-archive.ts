import { createHash } from 'node:crypto';
import { diagnosisSchema } from '$lib/model/diagnosis-schema';
import {
  archivedConditionsSchema,
  datasetFileSchema,
  reportsFileSchema,
  teamFileSchema,
  type DatasetFile,
  type ReportsFile,
  type TeamFile
} from '$lib/model/team/transfer/archive-schema';
import { BadInput, type Diagnosis } from '$lib/stats/types';
import { countFacts, type CountFacts } from '../datasets/count-facts';
import { misfits } from '../datasets/misfits';
import type { ArchiveRefusal, OpenArchive } from './open-archive';
import { ARCHIVE_WEIGHT } from './parse-json';
import { Bad, bad, readEntry } from './read-entry';
import { readSweeps, type ReadArchivedSweep } from './read-sweeps';

export interface ReadDataset {
  path: string;
  file: DatasetFile;
  facts: CountFacts;
  original: Uint8Array;
}

export interface ReadReport {
  about: ReportsFile[number];
  text: string;
  document: Diagnosis;
}

export type ReadArchive =
  | {
      ok: true;
      team: TeamFile;
      datasets: ReadDataset[];
      reports: ReadReport[];
      sweeps: ReadArchivedSweep[];
    }
  | ArchiveRefusal;

/** Reads what an opened archive says, and holds every file to what this program would have written. */
export function readArchive({ files }: Extract<OpenArchive, { ok: true }>): ReadArchive {
  try {
    const team = readEntry(files, 'team.json', teamFileSchema);
    const paths = [...files.keys()].filter((path) => /^datasets\/.*json$/.test(path)).sort();
    const datasets = paths.map((path) => readDataset(files, path));
    const byPath = new Map(datasets.map((it) => [it.path, it]));
    const reports = readEntry(files, 'reports.json', reportsFileSchema, ARCHIVE_WEIGHT).map((about) =>
      readReport(files, about, byPath)
    );
    const numbers = new Set(reports.map(({ about }) => `${about.dataset} ${about.number}`));
    if (numbers.size < reports.length) bad('reports.json: two reports of a dataset have one number.');
    return { ok: true, team, datasets, reports, sweeps: readSweeps(files) };
  } catch (error) {
    if (error instanceof Bad) return { ok: false, reason: 'bad-file', what: error.message };
    throw error;
  }
}

function readDataset(files: Map<string, Uint8Array>, path: string): ReadDataset {
  const asWritten = readEntry(files, path, datasetFileSchema, ARCHIVE_WEIGHT);
  const file = { ...asWritten, conditions: archivedConditionsSchema.parse(asWritten.conditions) };
  const { sha256, size } = file.original;
  const original =
    files.get(`originals/${sha256}`) ?? bad(`${path}: its original file ${sha256} is missing.`);
  if (original.length !== size || createHash('sha256').update(original).digest('hex') !== sha256)
    bad(`${path}: its original file is not the one of that sum.`);
  try {
    const facts = countFacts(file.counts);
    if (facts.digest !== file.digest) bad(`${path}: its digest is not that of its counts.`);
    const problems = Object.values(misfits(file.conditions, file.counts));
    if (problems.length > 0) bad(`${path}: ${problems[0]}`);
    return { path, file, facts, original };
  } catch (error) {
    if (error instanceof BadInput) return bad(`${path}: ${error.reason}`);
    throw error;
  }
}

function readReport(
  files: Map<string, Uint8Array>,
  about: ReportsFile[number],
  datasets: Map<string, ReadDataset>
): ReadReport {
  const document = readEntry(files, about.file, diagnosisSchema) as Diagnosis;
  const text = new TextDecoder('utf-8', { ignoreBOM: true }).decode(files.get(about.file));
  if (createHash('sha256').update(text).digest('hex') !== about.sha256)
    bad(`${about.file} is not the document of that sum.`);
  const its = datasets.get(about.dataset) ?? bad(`${about.file}: its dataset is not in the archive.`);
  if (document.data.digest !== its.facts.digest)
    bad(`${about.file} is a diagnosis of other counts than ${about.dataset}.`);
  for (const [i, { thread, link }] of about.remarks.entries()) {
    if (thread !== null && (thread >= i || about.remarks[thread].thread !== null))
      bad(`reports.json: a remark on ${about.file} answers one that does not come before it.`);
    if (link !== null && link >= about.links.length)
      bad(`reports.json: a remark on ${about.file} came through a link that is not there.`);
  }
  return { about, text, document };
}
