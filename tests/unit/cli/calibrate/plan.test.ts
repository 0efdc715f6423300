import { describe, expect, it } from 'vitest';
import { readArguments } from '../../../../src/cli/calibrate/arguments';
import { plan } from '../../../../src/cli/calibrate/plan';

function asked(...args: string[]) {
  const read = readArguments(args);
  if (!read.ok) throw new Error(read.reason);
  return read.asked;
}

describe('npm run calibrate', () => {
  it('takes every truth at 300, 3000 and 30000 shots, with 300, 300 and 200 repeats', () => {
    const { rows } = plan(asked('--violation', 'none'));
    expect(rows.length).toBe(3 * 16);
    for (const { shots, repeats, strength } of rows) {
      expect(repeats).toBe(shots === 30_000 ? 200 : 300);
      expect(strength).toBeNull();
    }
  });

  it('gives every repeat of every row to exactly one job', () => {
    const { rows, jobs } = plan(asked('--truth', 'equal', '--violation', 'drift', '--repeats', '13'));
    rows.forEach(({ repeats, shots, id }, row) => {
      const own = jobs.filter((job) => job.row === row);
      expect(own.every((job) => job.shots === shots && job.id === id)).toBe(true);
      const indices = own.flatMap(({ from, to }) => Array.from({ length: to - from }, (_, i) => from + i));
      expect(indices).toEqual(Array.from({ length: repeats }, (_, i) => i));
    });
  });

  it('chooses by the beginning of a name', () => {
    expect(asked('--truth', 'spread,equal-12').truths).toEqual([
      'spread-12',
      'spread-20',
      'spread-64',
      'spread-unknown',
      'equal-12'
    ]);
    expect(asked('--truth', 'none').truths).toEqual([]);
  });

  it.each([
    [['--truth', 'round'], 'there is none'],
    [['--repeats', '1.5'], 'whole numbers'],
    [['--shots', '300,x'], 'whole numbers'],
    [['--nonsense'], 'nonsense']
  ])('refuses %j', (args, reason) => {
    const read = readArguments(args);
    expect(read.ok).toBe(false);
    if (!read.ok) expect(read.reason).toContain(reason);
  });
});
