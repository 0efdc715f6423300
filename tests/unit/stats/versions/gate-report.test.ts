import { shotsOf } from '$lib/stats/calibration/shots-of';
import { betaBinomial } from '$lib/stats/calibration/violations/common-cause';
import { binomialSample } from '$lib/stats/random/binomial-sample';
import { generator, type Generator } from '$lib/stats/random/generator';
import { BadInput } from '$lib/stats/types';
import { gateReport } from '$lib/stats/versions/gate-report';
import type { GateRule, VersionCell } from '$lib/stats/versions/types';
import { describe, expect, it } from 'vitest';

const GROUPS = ['a', 'b', 'c', 'd', 'e', 'f', 'g', 'h'];
const rule: GateRule = { reference: '1', tolerance: 0.1, alpha: 0.05, groups: null };

function cell(group: string, version: string, counts: [number, number][], more: Partial<VersionCell> = {}) {
  const histogram = { kind: 'histogram' as const, counts, lump: null };
  const label = `${group} ${version}`;
  return {
    group,
    version,
    label,
    histogram,
    trials: 64,
    unit: 'defect',
    geometry: 'sites',
    ...more
  } as VersionCell;
}

/** All groups of a version: 64 equal trials, the first group with variance `rise` times the ceiling. */
function version(random: Generator, name: string, shots: number, mean = 0.1, rise = 1): VersionCell[] {
  return GROUPS.map((group, i) => {
    const crossed = i === 0 && rise > 1;
    const { counts } = crossed
      ? betaBinomial(random, shots, 64, mean, (rise - 1) / 63) // variance 1 + 63ρ ceilings
      : shotsOf(shots, () => binomialSample(random, 64, mean));
    return cell(group, name, counts);
  });
}

describe('gateReport', () => {
  it.each([
    ['the same mean', 0.1],
    ['another mean', 0.14]
  ])('fails no more than alpha of versions with the law of the reference, at %s', (_, mean) => {
    let failed = 0;
    for (let run = 0; run < 400; run++) {
      const random = generator(51, run);
      const cells = [...version(random, '1', 500), ...version(random, '2', 500, mean)];
      // Tolerance 0: at the ceiling both tests are at their edge.
      if (gateReport({ ...rule, tolerance: 0 }, '2', cells).outcome === 'failed') failed++;
    }
    // 5 % of 400 is 20, with a standard deviation of 4.4.
    expect(failed).toBeLessThanOrEqual(33);
    expect(failed).toBeGreaterThan(3);
  });

  it('fails a version whose one group has 1.3 of the ceiling at 5000 shots, and names that group alone', () => {
    let [failed, alone] = [0, 0];
    for (let run = 0; run < 20; run++) {
      const random = generator(52, run);
      const cells = [...version(random, '1', 5000), ...version(random, '2', 5000, 0.1, 1.3)];
      const { outcome, groups } = gateReport(rule, '2', cells);
      if (outcome === 'failed') failed++;
      if (
        groups
          .filter((group) => group.outcome === 'failed')
          .map(({ group }) => group)
          .join() === 'a'
      )
        alone++;
    }
    expect(failed).toBe(20);
    expect(alone).toBeGreaterThanOrEqual(18);
  });

  it('holds a reference to the tolerance alone', () => {
    const own = gateReport(rule, '1', version(generator(53, 0), '1', 8000));
    expect(own).toMatchObject({ outcome: 'passed', tests: 8 });
    expect(own.groups.every(({ overReference }) => overReference === null)).toBe(true);
  });

  const random = generator(54, 0);
  const [one, two] = [version(random, '1', 8000), version(random, '2', 8000)];
  it.each<[string, Partial<VersionCell> | null, string]>([
    ['is missing', null, 'no-counts'],
    ['waits for its diagnosis', { diagnosis: null }, 'not-diagnosed'],
    ['has N unknown', { trials: null }, 'trials-differ'],
    ['is counted in another geometry', { geometry: 'open-bonds' }, 'geometry-differs'],
    ['has odd pairs', { unit: 'pair' }, 'odd-pairs'],
    ['counts bonds of a ring one by one', { geometry: 'ring-bonds' }, 'ring-in-defects'],
    ['was cut', { kept: { from: 1, to: null } }, 'cut'],
    ['has misread bonds', { geometry: 'open-bonds', misread: 0.01 }, 'misread-bonds'],
    [
      'lumps counts',
      { histogram: { kind: 'histogram', counts: [[0, 9]], lump: { from: 1, shots: 9 } } },
      'lumped'
    ],
    ['does not vary', { histogram: { kind: 'histogram', counts: [[3, 900]], lump: null } }, 'no-spread']
  ])('is undecided where a group %s, and says so', (_, change, hindrance) => {
    const rest = change ? [{ ...two[0], ...change }, ...two.slice(1)] : two.slice(1);
    const report = gateReport(rule, '2', [...one, ...rest]);
    expect(report.outcome).toBe('undecided');
    expect(report.groups.filter(({ outcome }) => outcome === 'undecided').map(({ group }) => group)).toEqual([
      'a'
    ]);
    expect(report.groups[0].hindrances).toContain(hindrance);
    expect(report.because[0]).toMatch(/^a: Version 2 /);
    expect(report.tests).toBe(16);
  });

  it('is undecided with too few shots, and when the reference is gone', () => {
    const few = gateReport(rule, '2', [...version(random, '1', 500), ...version(random, '2', 500)]);
    expect(few.outcome).toBe('undecided');
    expect(few.groups[0].hindrances).toEqual(['too-few-shots']);
    // (z at 0.05/16 + z at 80 %)·√(2·(1 − 1/64)/500): quantiles 2.734, 0.8416 from tables; 1.1·exp(0.2244) − 1.
    expect(few.groups[0].smallestExcess).toBeGreaterThan(0.37);
    // Of a difference of two: exp(0.2244·√2) − 1.
    expect(few.groups[0].smallestRise).toBeGreaterThan(0.37);
    const gone = gateReport({ ...rule, reference: null }, '2', two);
    expect(gone.outcome).toBe('undecided');
    expect(gone.because[0]).toContain('the reference is gone');
  });

  it('does not pass a failed version once missing groups come in', () => {
    const crossed = version(generator(55, 0), '2', 8000, 0.1, 1.5);
    const early = gateReport(rule, '2', [...one, crossed[0]]);
    const late = gateReport(rule, '2', [...one, ...crossed]);
    expect([early.outcome, late.outcome]).toEqual(['failed', 'failed']);
    expect(early.groups[0].overTolerance?.pAdjusted).toBeGreaterThanOrEqual(
      late.groups[0].overTolerance!.pAdjusted
    );
  });

  it('does not pass where too few shots would hide a rise of the tolerance: of 60 versions with such a rise', () => {
    const one: GateRule = { ...rule, groups: ['a'] };
    const outcomes = Array.from({ length: 60 }, (_, run) => {
      const random = generator(56, run);
      const cells = [...version(random, '1', 2500), ...version(random, '2', 2500, 0.1, 1.1)];
      return gateReport(one, '2', cells).outcome;
    });
    expect(outcomes).not.toContain('passed');
  });

  it('does not pass a group whose own interval lies above the tolerance, and says a pass in its numbers', () => {
    let [near, above] = [0, 0];
    for (let run = 0; run < 40; run++) {
      const random = generator(57, run);
      const cells = [...version(random, '1', 8000, 0.1, 1.12), ...version(random, '2', 8000, 0.1, 1.15)];
      const [{ outcome, dispersion, hindrances, reasons }] = gateReport(rule, '2', cells).groups;
      if (hindrances.includes('above-tolerance')) near++;
      if (outcome !== 'passed') continue;
      expect(dispersion!.low).toBeLessThanOrEqual(1.1);
      if (dispersion!.value <= 1.1) continue;
      above++;
      expect(reasons[0]).toContain('above 1.10, but not by more than chance allows');
    }
    expect(near).toBeGreaterThan(0);
    expect(above).toBeGreaterThan(0);
  });

  it('passes only where the smallest rise seen is within the tolerance, and says it so', () => {
    const outcomes = new Set<string>();
    for (const shots of [4000, 5500, 7000, 9000]) {
      const random = generator(58, shots);
      const cells = [...version(random, '1', shots), ...version(random, '2', shots)];
      for (const { outcome, smallestRise, reasons } of gateReport(rule, '2', cells).groups) {
        const said = Number(/a rise under ([\d.]+)\u202f%/.exec(reasons.join(' '))?.[1]);
        if (outcome === 'passed') expect(Math.max(smallestRise!, said / 100)).toBeLessThanOrEqual(0.1);
        if (outcome === 'undecided') expect(Math.min(smallestRise!, said / 100)).toBeGreaterThan(0.1);
        outcomes.add(outcome);
      }
    }
    expect([...outcomes].sort()).toEqual(['passed', 'undecided']);
  });

  it('says what excess is seen to be above the tolerance', () => {
    const { groups } = gateReport({ ...rule, tolerance: 0.5 }, '1', one);
    // The level is 0.05/8: quantiles 2.498 and 0.8416 from tables; 1.5·exp(3.339·√(2·(63/64)/8000)) − 1 = 0.581.
    expect(groups[0].smallestExcess).toBeGreaterThan(0.57);
    expect(groups[0].smallestExcess).toBeLessThan(0.61);
  });

  it('takes only the groups of the rule', () => {
    const report = gateReport({ ...rule, groups: ['b', 'c'] }, '2', [...one, ...two.slice(1)]);
    expect(report.groups.map(({ group }) => group)).toEqual(['b', 'c']);
    expect(report.outcome).toBe('passed');
  });

  it('refuses rules that say nothing', () => {
    expect(() => gateReport({ ...rule, tolerance: -1 }, '2', two)).toThrow(BadInput);
    expect(() => gateReport({ ...rule, alpha: 1 }, '2', two)).toThrow(BadInput);
    expect(() => gateReport(rule, '2', [])).toThrow(BadInput);
    expect(() => gateReport(rule, '2', [...two, two[0]])).toThrow(BadInput);
  });
});
