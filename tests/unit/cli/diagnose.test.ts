import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { diagnosisSchema } from '$lib/model/diagnosis-schema';
import { needCommand, run, start } from './run-diagnose';

let folder: string;

beforeAll(() => {
  needCommand();
  folder = mkdtempSync(join(tmpdir(), 'severalty-diagnose-'));
});
afterAll(() => rmSync(folder, { recursive: true, force: true }));

const document = async (...args: string[]) => {
  const ran = await run([...args, '--json']);
  expect(ran.code).toBe(0);
  return diagnosisSchema.parse(JSON.parse(ran.out));
};
const few = ['--resamples', '99'];

describe('what it must show', () => {
  // Pearson 1900; values recomputed with R and SciPy, see science.md section 11.
  it('Weldon’s dice: compatible, equal trials', async () => {
    const { answer, moments, fit } = await document('fixtures/weldon-dice.csv', '--trials', '12');
    expect(answer.verdict).toBe('compatible');
    expect(moments.mean.value).toBeCloseTo(4.052383, 6);
    expect(fit.levels).toEqual([{ p: expect.closeTo(0.3376986, 7) as number, trials: 12 }]);
    expect(fit.gSquared).toBeCloseTo(11.4636, 4);
    expect(fit.floor).toBeCloseTo(0.000215, 6);
  });

  // Greenwood & Yule 1920, as above.
  it('Greenwood–Yule’s accidents: ruled out, bunching, other causes named', async () => {
    const { answer, moments, flags } = await document('fixtures/greenwood-yule.csv');
    expect(answer.verdict).toBe('ruled-out');
    expect(moments.fano.value).toBeCloseTo(1.487241, 6);
    const bunching = flags.find(({ id }) => id === 'bunching');
    expect(bunching?.grade).toBe('shown');
    expect(bunching?.otherCauses.length).toBeGreaterThan(0);
  });

  it('the lumped copy of Weldon’s table keeps its lump', async () => {
    const { data, answer } = await document('fixtures/weldon-dice-lumped.csv', '--trials', '12', ...few);
    expect(data).toMatchObject({ shots: 26306, lump: { from: 10, shots: 18 } });
    expect(answer.verdict).toBe('compatible');
  });
});

describe('standard output', () => {
  it('has the document and nothing else with --json; remarks go to standard error', async () => {
    const ran = await run(['fixtures/weldon-dice.csv', '--trials', '12', '--json', ...few]);
    expect(ran.out).toBe(`${JSON.stringify(JSON.parse(ran.out), null, 2)}\n`);
    expect(ran.errors).toContain('Column "dice" is the count');
    const quiet = await run(['fixtures/weldon-dice.csv', '--trials', '12', '--json', '--quiet', ...few]);
    expect(quiet).toEqual({ ...ran, errors: '' });
  });

  it('is words by default', async () => {
    const ran = await run(['fixtures/weldon-dice.csv', '--trials', '12', ...few]);
    expect(ran).toMatchObject({ code: 0, errors: '' });
    expect(ran.out.startsWith('Compatible with independent trials\n')).toBe(true);
    expect((await run(['fixtures/weldon-dice.csv', '--trials', '12', '--text', ...few])).out).toBe(ran.out);
  });

  it('closed early is no error', async () => {
    const child = start(['fixtures/weldon-dice.csv', '--json', '--quiet', ...few]);
    child.stdout?.destroy();
    let errors = '';
    child.stderr?.on('data', (text: Buffer) => (errors += text.toString()));
    const code = await new Promise((resolve) => child.on('close', resolve));
    expect({ code, errors }).toEqual({ code: 0, errors: '' });
  });

  it('has the help with --help', async () => {
    const ran = await run(['--help']);
    expect(ran.code).toBe(0);
    for (const option of ['--trials', '--fail-on', '--supplied', '--separator', '--dataset']) {
      expect(ran.out).toContain(option);
    }
  });
});

describe('options', () => {
  it('reach the engine', async () => {
    const made = await document(
      'fixtures/demo/ring-kinks.csv',
      '--trials',
      '40',
      '--unit',
      'pair',
      '--geometry',
      'ring-bonds',
      '--misread',
      '0.01',
      '--misread-uncertainty',
      '0.002',
      '--alpha',
      '0.05',
      '--tolerance',
      '0.2',
      '--resamples',
      '49',
      '--seed',
      '7'
    );
    expect(made.engine).toMatchObject({ alpha: 0.05, tolerance: 0.2, resamples: 49, seed: 7 });
    expect(made.data).toMatchObject({
      trials: 40,
      unit: 'pair',
      geometry: 'ring-bonds',
      misread: 0.01,
      misreadUncertainty: 0.002
    });
  });

  it('the file’s own trials are used, unless others are given', async () => {
    const file = join(folder, 'stated.json');
    writeFileSync(file, '{"trials": 12, "counts": {"0": 30, "1": 40, "2": 9}}');
    expect((await document(file, ...few)).data.trials).toBe(12);
    expect((await document(file, '--trials', 'unknown', ...few)).data.trials).toBeNull();
    expect((await document(file, '--trials', '1e1', ...few)).data.trials).toBe(10);
  });

  it('--supplied adds a law to compare with', async () => {
    const file = join(folder, 'law.csv');
    writeFileSync(file, `# twelve dice\np\n${'0.33333\n'.repeat(12)}`);
    const { fit } = await document('fixtures/weldon-dice.csv', '--trials', '12', '--supplied', file, ...few);
    expect(fit.references.map(({ id }) => id)).toContain('supplied');
  });

  it('change the guesses about the file', async () => {
    const swapped = await run(['-', '--count-column', '2', '--json', '--quiet', ...few], '5,0\n6,1\n');
    expect(JSON.parse(swapped.out)).toMatchObject({
      data: {
        counts: [
          [0, 5],
          [1, 6]
        ]
      }
    });
    const byPosition = await run(['-', '--format', 'positions', '--json', '--quiet', ...few], '5\n6\n');
    expect(JSON.parse(byPosition.out)).toMatchObject({
      data: {
        counts: [
          [0, 5],
          [1, 6]
        ],
        ordered: false
      }
    });
    const named = await run(
      ['-', '--separator', 'comma', '--header', 'yes', '--shots-column', 'b', '--json', '--quiet', ...few],
      'a,b\n0,5\n1,6\n'
    );
    expect(JSON.parse(named.out)).toMatchObject({
      data: {
        counts: [
          [0, 5],
          [1, 6]
        ]
      }
    });
  });

  it('choose one of several datasets', async () => {
    const file = 'fixtures/demo/firmware-versions.csv';
    const ran = await run([file]);
    expect(ran).toMatchObject({ code: 2, out: '' });
    expect(ran.errors).toContain('--dataset "device Marram, firmware ebb 3.2"');
    const chosen = await run([file, '--dataset', 'device Marram, firmware ebb 3.2', ...few]);
    expect(chosen.code).toBe(0);
    expect(chosen.out).toContain('Dataset: device Marram, firmware ebb 3.2.');
    expect((await run([file, '--dataset', 'x'])).code).toBe(2);
  });
});
