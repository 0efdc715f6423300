import { copyFileSync, mkdtempSync, readFileSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { needCommand, run } from './run-diagnose';

let folder: string;
const few = ['--trials', '12', '--resamples', '19'];

beforeAll(() => {
  needCommand();
  folder = mkdtempSync(join(tmpdir(), 'severalty-pdf-'));
});
afterAll(() => rmSync(folder, { recursive: true, force: true }));

describe('--pdf', () => {
  it('writes the report beside what is printed, the same bytes each time', async () => {
    const [first, second] = [join(folder, 'first.pdf'), join(folder, 'second.pdf')];
    const plain = await run(['fixtures/weldon-dice.csv', ...few]);
    expect(await run(['fixtures/weldon-dice.csv', ...few, '--pdf', first])).toEqual(plain);
    const json = await run(['fixtures/weldon-dice.csv', ...few, '--json', '--quiet', '--pdf', second]);
    expect(JSON.parse(json.out)).toHaveProperty('format', 'severalty.diagnosis/1');
    const bytes = readFileSync(first);
    expect(bytes.toString('latin1', 0, 8)).toBe('%PDF-1.7');
    expect(bytes.toString('latin1').trimEnd().endsWith('%%EOF')).toBe(true);
    expect(Buffer.compare(bytes, readFileSync(second))).toBe(0);
  });

  it('refuses a place where nothing can be written, before it counts', async () => {
    const counts = join(folder, 'counts.csv');
    copyFileSync('fixtures/weldon-dice.csv', counts);
    const before = readFileSync(counts, 'utf8');
    for (const [pdf, reason] of [
      [join(folder, 'none', 'a.pdf'), 'There is no such folder.'],
      [folder, 'This is a folder, not a file.'],
      [counts, 'This is the file of counts']
    ]) {
      const ran = await run([counts, ...few, '--pdf', pdf]);
      expect(ran).toMatchObject({ code: 2, out: '' });
      expect(ran.errors).toContain(reason);
    }
    expect(readFileSync(counts, 'utf8')).toBe(before);
  });
});
