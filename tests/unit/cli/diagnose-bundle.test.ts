import { unzipSync } from 'fflate';
import { copyFileSync, mkdirSync, mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { createHash } from 'node:crypto';
import { tmpdir } from 'node:os';
import { dirname, join } from 'node:path';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { Diagnosis } from '$lib/stats/types';
import { needCommand, run } from './run-diagnose';

let folder: string;
beforeAll(() => {
  needCommand();
  folder = mkdtempSync(join(tmpdir(), 'severalty-bundle-'));
});
afterAll(() => rmSync(folder, { recursive: true, force: true }));

/** Every sort of file and option that changes the document; resamples are few since only bytes are compared. */
const CASES: [name: string, file: string, options: string][] = [
  ['dice', 'weldon-dice.csv', '--trials 12 --resamples 99'],
  ['a lump', 'weldon-dice-lumped.csv', '--trials 12 --resamples 49 --seed 77'],
  [
    'trials unknown, ruled out',
    'greenwood-yule.csv',
    '--trials unknown --resamples 199 --alpha 0.005 --tolerance 0.25'
  ],
  ['pairs on a ring', 'demo/ring-kinks.csv', '--trials 64 --unit pair --geometry ring-bonds --resamples 49'],
  ['misreads', 'demo/misread-kinks.csv', '--trials 50 --geometry open-bonds --misread 0.01 --resamples 49'],
  ['shots in batches', 'demo/drifting-shots.csv', '--trials 60 --resamples 49'],
  ['one of several datasets', 'demo/firmware-versions.csv', '--trials 48 --resamples 49 --dataset DATASET']
];

const text = (bytes: Uint8Array) => new TextDecoder().decode(bytes);

async function bundle(file: string, options: string[], out: string): Promise<Record<string, Uint8Array>> {
  const ran = await run([file, ...options, '--quiet', '--bundle', out]);
  expect(ran).toMatchObject({ code: 0, errors: '' });
  return unzipSync(readFileSync(out));
}

/** Unpacks into a folder of its own, as a person would. */
function unpack(files: Record<string, Uint8Array>, where: string): void {
  for (const [path, bytes] of Object.entries(files)) {
    mkdirSync(dirname(join(where, path)), { recursive: true });
    writeFileSync(join(where, path), bytes);
  }
}

describe('--bundle', () => {
  it.each(CASES)(
    'of %s is computed again by the command in its README, byte for byte',
    async (name, file, said) => {
      const options = said
        .split(' ')
        .map((word) => (word === 'DATASET' ? 'device Marram, firmware ebb 3.3' : word));
      const files = await bundle(`fixtures/${file}`, options, join(folder, `${name}.zip`));
      const where = join(folder, name);
      unpack(files, where);
      const [root] = Object.keys(files)[0].split('/');
      const readme = text(files[`${root}/README.txt`]);
      const found = /^npm run --silent diagnose -- (.+) > (.+)$/m.exec(readme)!;
      const again = await run(found[1].split(' '), undefined, where);
      expect(again).toMatchObject({ code: 0, errors: '' });
      expect(again.out).toBe(text(files[`${root}/document.json`]));
      expect(readme).toContain(`cmp ${root}/document.json ${found[2]}`);
    }
  );

  it('holds the document that --json prints, and sums that are right', async () => {
    const options = ['--trials', '12', '--resamples', '19'];
    const files = await bundle('fixtures/weldon-dice.csv', options, join(folder, 'sums.zip'));
    const json = await run(['fixtures/weldon-dice.csv', ...options, '--json', '--quiet']);
    const csv = await run(['fixtures/weldon-dice.csv', ...options, '--csv', '--quiet']);
    const [root] = Object.keys(files)[0].split('/');
    const file = (path: string) => files[`${root}/${path}`];
    expect(text(file('document.json'))).toBe(json.out);
    expect(text(file('numbers.csv'))).toBe(csv.out);
    expect(Buffer.compare(file('original/weldon-dice.csv'), readFileSync('fixtures/weldon-dice.csv'))).toBe(
      0
    );
    const sums = text(file('SHA256SUMS')).trim().split('\n');
    expect(sums).toHaveLength(Object.keys(files).length - 1);
    for (const line of sums) {
      const [sum, path] = line.split('  ');
      expect(createHash('sha256').update(file(path)).digest('hex'), path).toBe(sum);
      if (path !== 'README.txt') expect(text(file('README.txt'))).toContain(`sha256 ${sum}`);
    }
  });

  it('has the same bytes each time, and those of --pdf in it', async () => {
    const options = ['--trials', '12', '--resamples', '19', '--pdf', join(folder, 'a.pdf')];
    const first = await bundle('fixtures/weldon-dice.csv', options, join(folder, '1.zip'));
    await bundle('fixtures/weldon-dice.csv', options, join(folder, '2.zip'));
    expect(Buffer.compare(readFileSync(join(folder, '1.zip')), readFileSync(join(folder, '2.zip')))).toBe(0);
    const pdf = Object.entries(first).find(([path]) => path.endsWith('report.pdf'))![1];
    expect(Buffer.compare(pdf, readFileSync(join(folder, 'a.pdf')))).toBe(0);
  });

  it('takes the law along that was given to compare with', async () => {
    const law = join(folder, 'law.txt');
    writeFileSync(law, Array.from({ length: 12 }, (_, i) => String((i + 1) / 30 + 1e-9)).join('\n'));
    const options = ['--trials', '12', '--resamples', '19', '--supplied', law];
    const files = await bundle('fixtures/weldon-dice.csv', options, join(folder, 'law.zip'));
    const where = join(folder, 'law');
    unpack(files, where);
    const [root] = Object.keys(files)[0].split('/');
    const command = /^npm run --silent diagnose -- (.+) > /m.exec(text(files[`${root}/README.txt`]))![1];
    const again = await run(command.split(' '), undefined, where);
    const kept = text(files[`${root}/document.json`]);
    expect((JSON.parse(kept) as Diagnosis).fit.references.map(({ id }) => id)).toContain('supplied');
    expect(again.out).toBe(kept);
  });

  it('refuses the file of counts as its place', async () => {
    const counts = join(folder, 'counts.csv');
    copyFileSync('fixtures/weldon-dice.csv', counts);
    const ran = await run([counts, '--trials', '12', '--bundle', counts]);
    expect(ran).toMatchObject({ code: 2, out: '' });
    expect(ran.errors).toContain('give the zip another name');
    expect(readFileSync(counts, 'utf8')).toBe(readFileSync('fixtures/weldon-dice.csv', 'utf8'));
  });
});
