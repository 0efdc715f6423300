import { FIRMWARE_GROUPS, firmwareFiles } from '$lib/stats/demo/firmware-files';
import { spawnSync } from 'node:child_process';
import { describe, expect, it } from 'vitest';

const run = (args: string[], input = '') =>
  spawnSync(process.execPath, ['build-cli/gate.js', ...args], { input, encoding: 'utf8' });

/** The files of fixtures/firmware as one table. */
const rows = firmwareFiles().flatMap(({ name, text }) => {
  const [version, group] = [name.slice(0, 7), name.slice(8)];
  const counts = text.trim().split('\n').slice(2);
  return counts.map((row) => `Shingle,${version},${group.replace('.csv', '')},16,${row}`);
});
const TABLE = `device,firmware,group,trials,count,shots\n${rows.join('\n')}\n`;
const against = (version: string) => ['-', '--version', version, '--reference', 'ebb-3.1'];
/** Of two groups under two versions, 60 shots each; invented. */
const FEW = `firmware,group,trials,count,shots\n${['a', 'b']
  .flatMap((version) => ['q1', 'q2'].map((group) => `${version},${group},9,0,30\n${version},${group},9,1,30`))
  .join('\n')}\n`;

describe('npm run gate', () => {
  it('ends with 0, 1 and 3: passed, failed, undecided', () => {
    const codes = ['ebb-3.1', 'ebb-3.2', 'ebb-3.3', 'ebb-3.4'].map((one) => run(against(one), TABLE).status);
    expect(codes).toEqual([0, 0, 1, 0]);
    const few = run(['-', '--version', 'b', '--reference', 'a'], FEW);
    expect([few.status, few.stderr]).toEqual([3, '']);
    expect(few.stdout).toContain('Too few shots');
  });

  it('says why, group by group, and that a version may fail by chance', () => {
    const { stdout, stderr } = run(against('ebb-3.3'), TABLE);
    expect(stderr).toBe('');
    expect(stdout).toMatch(/^Version ebb-3\.3 fails: 2 of 8 groups scatter/);
    const words = stdout.replace(/\s+/g, ' ');
    expect(words).toContain('a gate fails one without cause now and then');
    for (const group of FIRMWARE_GROUPS)
      expect(stdout).toMatch(new RegExp(`^${group} +(passed|failed) `, 'm'));
  });

  it('prints the document alone, the same bytes again, of the groups asked for', () => {
    const args = [...against('ebb-3.3'), '--json', '--group', 'q1', '--group', 'q3'];
    const { stdout, status } = run(args, TABLE);
    expect(status).toBe(0);
    expect(JSON.parse(stdout)).toMatchObject({
      format: 'severalty.gate/1',
      outcome: 'passed',
      rule: { reference: 'ebb-3.1', groups: ['q1', 'q3'] },
      tests: 4
    });
    expect(run(args, TABLE).stdout).toBe(stdout);
  });

  it('takes a table without groups as the whole device, and refuses the same one twice', () => {
    const file = 'fixtures/demo/firmware-versions.csv';
    const args = ['--version', 'ebb 3.3', '--reference', 'ebb 3.1', '--trials', '48'];
    expect(run([file, ...args]).status).toBe(1);
    const twice = run([file, file, ...args]);
    expect([twice.status, twice.stdout]).toEqual([2, '']);
    expect(twice.stderr).toMatch(/Group whole device stands twice in version ebb 3\.3/);
  });

  it.each([
    [['-', '--reference', 'a'], FEW, '--version is missing'],
    [['-', '--version', 'b'], FEW, '--reference is missing'],
    [['-', '--version', 'c', '--reference', 'a'], FEW, 'There is no version c; there are: a, b.'],
    [['-', '--version', 'b', '--reference', 'a', '--device', 'Kelp'], FEW, 'There is no device Kelp'],
    [['-', '--version', 'b', '--reference', 'a', '--alpha', '1'], FEW, '--alpha takes a level'],
    [['-', '--version', 'b', '--reference', 'a', '--tolerance', '-1'], FEW, '--tolerance'],
    [['-', '--version', 'b', '--reference', 'a'], 'count,shots\n0,5\n1,6\n', 'states no firmware version'],
    [['-', '--version', 'b', '--reference', 'a'], 'firmware,count,shots\na,-1,5\n', 'standard input:2'],
    [['--version', 'b', '--reference', 'a'], '', 'No file is named'],
    [['no-such-file', '--version', 'b', '--reference', 'a'], '', 'There is no such file']
  ])('refuses %j with code 2 and its reason', (args, input, reason) => {
    const { status, stdout, stderr } = run(args, input);
    expect(stderr).toContain(reason);
    expect({ status, stdout }).toEqual({ status: 2, stdout: '' });
  });
});
