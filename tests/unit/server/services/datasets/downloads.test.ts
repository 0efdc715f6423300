import { readCounts } from '$lib/formats/read-counts';
import { csvCell } from '$lib/model/exports/csv-cell';
import { csvOfDataset } from '$lib/server/services/datasets/csv-of-dataset';
import { originalOfDataset } from '$lib/server/services/datasets/original-of-dataset';
import { safeFileName } from '$lib/server/services/datasets/safe-file-name';
import { saveDatasets } from '$lib/server/services/datasets/save-datasets';
import { storeFile } from '$lib/server/services/datasets/store-file';
import { takeSample } from '$lib/server/services/datasets/take-sample';
import { seedSamples } from '$lib/server/services/seed-samples';
import { describe, expect, it } from 'vitest';
import { makeDataset } from '../../../../support/datasets';
import { setting, store, wholeFile } from './support';

const unknown = { ok: false, reason: 'unknown' };

describe('originalOfDataset', () => {
  it('gives the file byte for byte, to the team alone', () => {
    const { db, lead, observer, stranger } = setting();
    // UTF-16 with a mark in front: nothing may be converted on the way.
    const bytes = new Uint8Array(Buffer.from('\ufeff0,5\r\n1,2\r\n', 'utf16le'));
    const stored = storeFile(db, lead, { name: '../a"b.csv', bytes });
    if (!stored.ok) throw new Error(stored.reason);
    const saved = saveDatasets(db, lead, wholeFile(db, lead, stored.file.id));
    if (!saved.ok) throw new Error(saved.reason);
    const { id } = saved.saved[0];
    const found = originalOfDataset(db, observer, id);
    if (!found.ok) throw new Error(found.reason);
    expect(new Uint8Array(found.bytes)).toEqual(bytes);
    expect(found.name).toBe('ab.csv');
    for (const actor of [stranger, { ...stranger, teamId: lead.teamId }]) {
      expect(originalOfDataset(db, actor, id)).toEqual(unknown);
      expect(csvOfDataset(db, actor, id)).toEqual(unknown);
    }
    db.$client.close();
  });
});

describe('csvOfDataset', () => {
  it.each([
    ['a histogram with a lump', '0,5\n1,2\n3+,4\n'],
    ['a shot list', 'count\n3\n1\n2\n1\n'],
    ['batches with odd names', 'shot,batch,count\n1,"morning, cold",2\n2,evening,0\n']
  ])('is read back to the same counts: %s', (_what, text) => {
    const { db, lead } = setting();
    const saved = saveDatasets(db, lead, wholeFile(db, lead, store(db, lead, text)));
    if (!saved.ok) throw new Error(saved.reason);
    const csv = csvOfDataset(db, lead, saved.saved[0].id);
    if (!csv.ok) throw new Error(csv.reason);
    const [before, after] = [readCounts(text), readCounts(csv.text)];
    if (!before.ok || !after.ok) throw new Error('not read');
    expect(after.datasets[0].data).toEqual(before.datasets[0].data);
    db.$client.close();
  });

  it('lets no cell be taken for a formula', () => {
    const { db, lead } = setting();
    const counts = JSON.stringify({ kind: 'shots', shots: [1], batches: ['=HYPERLINK("x")'] });
    const csv = csvOfDataset(db, lead, makeDataset(db, lead, { counts, kind: 'shots' }));
    expect(csv).toMatchObject({ text: 'shot,batch,count\r\n1,"\'=HYPERLINK(""x"")",1\r\n' });
    for (const text of ['=1+1', '+1', '-1', '@x', '\t=1', ' =1', '＝1'])
      expect(csvCell(text)).toMatch(/^"?'/);
    for (const text of ['plain', '1', 'a=b']) expect(csvCell(text)).toBe(text);
    db.$client.close();
  });
});

describe('safeFileName', () => {
  it.each([
    ['counts.csv', 'counts.csv'],
    ['../../etc/passwd', 'passwd'],
    ['C:\\data\\run 1.csv', 'run 1.csv'],
    ['a"b;c\r\nd.csv', 'abcd.csv'],
    ['..', 'counts'],
    ['', 'counts'],
    ['con.csv', '_con.csv'],
    ['Zählung – März.csv', 'Zählung – März.csv'],
    ['evil\u202evsc.exe', 'evilvsc.exe']
  ])('%j becomes %j', (given, expected) => expect(safeFileName(given)).toBe(expected));

  it('stays short and keeps its ending', () => {
    const name = safeFileName(`${'x'.repeat(500)}.csv`);
    expect(name).toHaveLength(120);
    expect(name.endsWith('.csv')).toBe(true);
  });
});

describe('takeSample', () => {
  it('saves an example as datasets, marked for what it is', () => {
    const { db, lead, observer } = setting();
    seedSamples(db);
    const saved = takeSample(db, lead, 'weldon-dice');
    expect(saved).toMatchObject({ ok: true, saved: [{ name: 'Weldon’s dice' }] });
    const invented = takeSample(db, lead, 'firmware-versions');
    if (!invented.ok) throw new Error(invented.reason);
    expect(invented.saved).toHaveLength(4);
    expect(takeSample(db, lead, 'weldon-dice')).toMatchObject({ ok: false, reason: 'already-there' });
    expect(takeSample(db, lead, 'nothing')).toEqual({ ok: false, reason: 'unknown-sample' });
    expect(takeSample(db, observer, 'weldon-dice')).toEqual({ ok: false, reason: 'not-allowed' });
    db.$client.close();
  });
});
