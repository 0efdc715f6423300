import { readDocument } from '$lib/model/read-document';
import { sayEngine } from '$lib/model/report/say-engine';
import { serverFonts } from '$lib/server/pdf/fonts';
import { reportPdf } from '$lib/pdf/report-pdf';
import { engineVersion } from '$lib/stats/engine-version';
import type { Diagnosis } from '$lib/stats/types';
import { beforeAll, describe, expect, it } from 'vitest';
import { diagnoseInvented } from '../../support/saved-reports';
import { BLIND } from '../pdf/documents';
import { plainSpaces, readPdf } from '../pdf/read-pdf';

type Loose = Record<string, Record<string, unknown>>;

/** The document as an engine wrote it that knew less: without the fields that are named. */
function aged(document: Diagnosis, fields: [string, string][]): string {
  const copy = JSON.parse(JSON.stringify(document)) as Loose & Record<string, unknown>;
  for (const [part, key] of fields)
    if (part) delete copy[part][key];
    else delete copy[key];
  copy.engine.version = '0.0.3';
  return JSON.stringify(copy);
}

const LATER: [string, string][] = [
  ['', 'notRun'],
  ['data', 'ordered'],
  ['data', 'batches'],
  ['data', 'lump'],
  ['fit', 'certified'],
  ['fit', 'omitted'],
  ['fit', 'divergenceInterval']
];

describe('a document of an older engine', () => {
  let document: Diagnosis;
  beforeAll(async () => {
    ({ document } = await diagnoseInvented());
  });

  it('knew the shots without empty ones by their variance alone, and is not given tests of them', () => {
    const { tests, ...variance } = {
      shots: 2600,
      mean: 3.1,
      ceiling: 2.4,
      dispersion: { value: 1.01, low: 0.95, high: 1.06 },
      p: 0.4,
      smallestP: 0.001,
      resamples: 248,
      tests: [],
      verdict: 'compatible',
      statement: 'The rest keeps it.'
    };
    const older = { ...document, nuisances: { ...document.nuisances, emptyAside: variance } };
    expect(readDocument(JSON.stringify(older))).toMatchObject({
      ok: true,
      diagnosis: { nuisances: { emptyAside: { ...variance, tests } } }
    });
  });

  it('is read, with what it does not say left unsaid', () => {
    const read = readDocument(aged(document, LATER));
    if (!read.ok) throw new Error(read.problem);
    expect(read.diagnosis.notRun).toEqual([]);
    expect(read.diagnosis.data).toMatchObject({ ordered: false, batches: null, lump: null });
    const { value, low, high } = read.diagnosis.fit.divergenceInterval;
    expect([value, low, high]).toEqual([document.fit.divergenceCorrected, null, null]);
    expect(read.diagnosis.moments).toEqual(document.moments);
  });

  it('is printed, and says which engine made it', async () => {
    const read = readDocument(aged(document, LATER));
    if (!read.ok) throw new Error(read.problem);
    const input = { document: read.diagnosis, documentSha256: 'ab'.repeat(32), provenance: BLIND };
    const { text } = readPdf(await reportPdf(input, serverFonts));
    expect(text).toContain(plainSpaces(sayEngine('0.0.3')));
    expect(text).toContain(`Made by engine 0.0.3; this program runs ${engineVersion}.`);
    const now = readPdf(await reportPdf({ ...input, document }, serverFonts));
    expect(now.text).not.toContain('Made by engine');
  });

  it('that lacks numbers is refused in words, with both engines', () => {
    const read = readDocument(aged(document, [['moments', 'variance']]));
    expect(read).toMatchObject({ ok: false });
    if (read.ok) return;
    expect(read.problem).toMatch(/^at moments\.variance: /);
    expect(read.problem).toContain(`(it was made by engine 0.0.3; this program runs ${engineVersion})`);
  });
});
