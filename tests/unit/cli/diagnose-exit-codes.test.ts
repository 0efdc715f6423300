import { mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { needCommand, run, start } from './run-diagnose';

let folder: string;

beforeAll(() => {
  needCommand();
  folder = mkdtempSync(join(tmpdir(), 'severalty-exit-codes-'));
});
afterAll(() => rmSync(folder, { recursive: true, force: true }));

describe('exit codes', () => {
  it.each([
    ['fixtures/greenwood-yule.csv', 'ruled-out', 3],
    ['fixtures/greenwood-yule.csv', 'undecided', 3],
    ['fixtures/demo/forty-shots.csv', 'ruled-out', 0],
    ['fixtures/demo/forty-shots.csv', 'undecided', 3],
    ['fixtures/weldon-dice.csv', 'undecided', 0]
  ])('%s with --fail-on %s ends with %d', async (file, answer, code) => {
    expect((await run([file, '--fail-on', answer])).code).toBe(code);
  });

  it.each([
    [[], 'No file is named.'],
    [['a', 'b'], '2 files are named'],
    [['fixtures/nothing.csv'], 'fixtures/nothing.csv: There is no such file.'],
    [['fixtures'], 'fixtures: This is a folder'],
    [['--bogus', 'x'], "Unknown option '--bogus'"],
    [
      ['fixtures/weldon-dice.csv', '--trials', 'many'],
      '--trials takes a whole number, or unknown, not "many".'
    ],
    [['fixtures/weldon-dice.csv', '--trials', '12.5'], 'trials'],
    [['fixtures/weldon-dice.csv', '--trials', '-3'], 'The number of trials must be a whole number'],
    [['fixtures/weldon-dice.csv', '--trials', '0'], 'The number of trials must be a whole number'],
    [['fixtures/weldon-dice.csv', '--seed', '-1'], 'The seed must be'],
    [
      ['fixtures/weldon-dice.csv', '--trials', '9'],
      'fixtures/weldon-dice.csv:14:1: The count 10 is above the 9 trials given.'
    ],
    [['fixtures/weldon-dice.csv', '--unit', 'kink'], '--unit takes defect, pair, not "kink".'],
    [['fixtures/weldon-dice.csv', '--alpha', '2'], 'alpha'],
    [['fixtures/weldon-dice.csv', '--alpha', ''], '--alpha takes'],
    [['fixtures/weldon-dice.csv', '--fail-on', 'constructor'], '--fail-on takes'],
    [['fixtures/weldon-dice.csv', '--json', '--text'], 'Both --json and --text'],
    [
      ['fixtures/weldon-dice.csv', '--supplied', 'fixtures/bad/negative.csv'],
      'fixtures/bad/negative.csv:2:3: "12" is above 1.'
    ],
    [['fixtures/bad/negative.csv'], 'fixtures/bad/negative.csv:3:3: "-3" is negative.'],
    [['fixtures/bad/empty.csv'], 'fixtures/bad/empty.csv:1:1: The file is empty.'],
    [['fixtures/bad/workbook.csv'], 'fixtures/bad/workbook.csv: This is a zip archive or an Excel'],
    [['fixtures/bad/many-problems.csv'], 'fixtures/bad/many-problems.csv: 10 more problems.']
  ])('%j ends with 2 and says why', async (args, reason) => {
    const ran = await run(args);
    expect(ran).toMatchObject({ code: 2, out: '' });
    expect(ran.errors).toContain(reason);
  });

  it('a file of 50 MB and an endless pipe are refused with the limit', async () => {
    const file = join(folder, 'large.csv');
    writeFileSync(file, Buffer.alloc(50 * 2 ** 20, '12,5\n'));
    for (const ran of [await run([file]), await run(['-'], readFileSync(file))]) {
      expect(ran).toMatchObject({ code: 2, out: '' });
      expect(ran.errors).toContain('20 MB');
    }
  });

  it('Ctrl-C ends with 130', async () => {
    const child = start(['-']);
    // Waiting for standard input: the handler stands before anything is read.
    await new Promise((resolve) => setTimeout(resolve, 1500));
    child.kill('SIGINT');
    expect(await new Promise((resolve) => child.on('close', resolve))).toBe(130);
  });
});
