import { spawnSync } from 'node:child_process';
import { describe, expect, it } from 'vitest';

const run = (args: string[], input = '') =>
  spawnSync(process.execPath, ['build-cli/sweep.js', ...args], { input, encoding: 'utf8' });

const table = (rows: [string, number, number][], head = 'quench_time_us') =>
  `${head},count,shots\n${rows.map((row) => row.join(',')).join('\n')}\n`;

/** Two datasets of five counts each; invented. */
const two = (first: string, second: string): [string, number, number][] =>
  [first, second].flatMap((time, i) =>
    [9, 30, 40, 16, 5].map((shots, n): [string, number, number] => [time, n * 2 + 2 * i, shots])
  );

/** Two datasets that state another condition each. */
const unlike = (condition: string, first: string, second: string) =>
  table(two(`5,${first}`, `9,${second}`), `quench_time_us,${condition}`);

describe('npm run sweep', () => {
  it('tells the invented quench sweep in words', () => {
    const { stdout, stderr, status } = run([
      'fixtures/demo/quench-sweep.csv',
      '--unit',
      'pair',
      '--transition',
      '1,1,1'
    ]);
    expect({ status, stderr }).toEqual({ status: 0, stderr: '' });
    expect(stdout).toMatch(
      /^One exponent, 0\.4\d+ \(95\u202f%: .* serves mean, variance and third\ncumulant/
    );
    expect(stdout.replace(/\s+/g, ' ')).toMatch(
      /gives dν\/\(1 \+ zν\) = 0\.5000, which the 95 % interval holds/
    );
    expect(stdout).toContain('quench time, µs');
  });

  it('says which devices differ, who is left out, and in words why nothing is fitted', () => {
    const few = table(
      ['D,1', 'E,2'].flatMap((head): [string, number, number][] => [0, 1, 2].map((n) => [head, n, 9])),
      'device,quench_time_us'
    );
    const { stdout, status } = run(['-'], few);
    expect(status).toBe(0);
    const said = stdout.replace(/\s+/g, ' ');
    expect(said).toMatch(
      /^No power law can be fitted: no dataset in the window takes four different counts, and fewer tell no errors\./
    );
    expect(said).toMatch(/The datasets are of 2 devices: /);
    expect(said).toMatch(/1\.000 \(left out\)/);
  });

  it('prints the document alone, the same bytes again', () => {
    const args = ['fixtures/demo/quench-sweep.csv', '--unit', 'pair', '--json', '--from', '2', '--to', '16'];
    const { stdout } = run(args);
    expect(JSON.parse(stdout)).toMatchObject({
      format: 'severalty.sweep/1',
      timeUnit: 'µs',
      window: { from: 2, to: 16 },
      laws: { quantities: 3 }
    });
    expect(run(args).stdout).toBe(stdout);
  });

  it.each([
    ['a time of zero', [], table(two('0', '5')), 'a time of 0'],
    ['a time below zero', [], table(two('-2', '5')), 'has a quench time of -2. A time is 0 or more'],
    ['one dataset', [], table(two('5', '9').slice(0, 5)), 'at least two datasets'],
    ['no time at all', [], 'count,shots\n0,5\n1,6\n2,3\n', 'states no quench time'],
    ['mixed units', [], table(two('5 ms', '9 cycles'), 'quench time'), 'Units are mixed'],
    ['hold times that are not there', ['--axis', 'hold'], table(two('5', '9')), 'states no hold time'],
    [
      'odd counts as pairs',
      ['--unit', 'pair'],
      'quench_time_us,count,shots\n1,1,5\n1,2,5\n2,4,5\n',
      'must be even'
    ],
    ['lumped counts', [], 'quench_time_us,count,shots\n1,0,5\n1,1,4\n1,2+,3\n2,0,5\n2,1,4\n', 'lumps counts'],
    ['a broken file', [], 'quench_time_us,count,shots\n1,-3,5\n', 'standard input:2:3'],
    [
      'a window the wrong way',
      ['--from', '9', '--to', '5'],
      '',
      'a time above 0 to a later one, not from 9 to 5'
    ],
    ['a window of one time', ['--from', '6'], table(two('5', '9')), 'widen it'],
    ['a transition of two numbers', ['--transition', '1,1'], '', 'three numbers'],
    ['a level of two', ['--alpha', '2'], '', '--alpha takes a level above 0 and below 0.5'],
    ['mixed N', [], unlike('qubits', '64', '128'), 'N = 64 and'],
    ['mixed geometry', [], unlike('geometry', 'sites', 'ring'), 'choose datasets of one geometry'],
    ['a level of words', ['--alpha', 'strict'], '', '--alpha takes'],
    ['an unknown axis', ['--axis', 'sideways'], '', 'quench or hold']
  ])('refuses %s with code 2', (_, args, input, words) => {
    const { status, stderr, stdout } = run(['-', ...args], input);
    expect(stderr).toContain(words);
    expect({ status, stdout }).toEqual({ status: 2, stdout: '' });
  });
});
