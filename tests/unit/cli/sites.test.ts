import { spawnSync } from 'node:child_process';
import { describe, expect, it } from 'vitest';

const run = (args: string[], input = '') =>
  spawnSync(process.execPath, ['build-cli/sites.js', ...args], { input, encoding: 'utf8' });

describe('npm run sites', () => {
  it('finds the one pair of the invented shots, and says that the counts alone hide it', () => {
    const { stdout, stderr, status } = run(['fixtures/sites/one-pair.txt', '--seek', 'rise']);
    expect({ status, stderr }).toEqual({ status: 0, stderr: '' });
    const words = stdout.replace(/\s+/g, ' ');
    expect(words).toMatch(/^One pair of 2 016 is correlated .* sites 21 and 22, correlation 0\.050/);
    expect(words).toContain('The count histogram alone cannot show this pair.');
    expect(words).toContain('A pair that is not found may be there.');
  });

  it('does not find it where either sign is looked for, as the README says', () => {
    const map = (...more: string[]) =>
      JSON.parse(run(['fixtures/sites/one-pair.txt', '--json', ...more]).stdout) as {
        pairs: { pHolm: number }[];
        power: { neighbour: { power: number } };
      };
    const figures = [map('--seek', 'rise'), map()].map(({ pairs, power }) => [
      Math.min(...pairs.map(({ pHolm }) => pHolm)).toFixed(3),
      Math.round(100 * power.neighbour.power)
    ]);
    expect(figures).toEqual([
      ['0.021', 58],
      ['0.070', 45]
    ]);
  });

  it('prints the document alone', () => {
    const { stdout } = run(['-', '--json', '--geometry', 'ring'], '110\n101\n000\n011\n');
    const map = JSON.parse(stdout);
    expect(map).toMatchObject({
      format: 'severalty.sites/1',
      geometry: 'ring',
      shots: 4,
      excited: [2, 2, 2]
    });
    // Two kinks in each of the shots that are not all alike.
    expect(map.counts.kinks).toEqual({ mean: 1.5, variance: 1, trials: 3 });
  });

  it.each([
    [['-'], '01\n0x\n', /standard input:2:2: Site 2 of this shot is “x”/],
    [['-', '--geometry', 'ring'], '01\n10\n', /A ring takes three sites or more/],
    [['-', '--seek', 'fall'], '', /--seek takes any or rise, not "fall"/],
    [['-', '--alpha', '2'], '', /--alpha takes a level between 0 and 1/],
    [['no-such-file'], '', /There is no such file/]
  ])('refuses %j with code 2 and its reason', (args, input, reason) => {
    const { status, stdout, stderr } = run(args, input);
    expect({ status, stdout }).toEqual({ status: 2, stdout: '' });
    expect(stderr).toMatch(reason);
  });
});
