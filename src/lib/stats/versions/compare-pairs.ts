import { holm } from '../multiple/holm';
import { unbroken, type Pace } from '../resampling/pace';
import { BadInput, type Histogram } from '../types';
import { equalHistograms, type EqualityTest } from './equal-histograms';

export interface PairsOptions {
  /** Shuffles of each pair at most. */
  resamples: number;
  seed: number;
  /** What Holm's rule takes together: the pairs of each group, or all pairs of all groups. `group` by default. */
  family?: 'group' | 'all';
  /** Whether two versions of a group can be compared at all; every two by default. */
  alike?: (group: string, first: string, second: string) => boolean;
}

export interface PairTest extends EqualityTest {
  group: string;
  first: string;
  second: string;
  pAdjusted: number;
}

export interface PairsReport {
  /** Which pairs were adjusted for each other, in words. */
  family: string;
  tests: PairTest[];
  /** Pairs that were not tested, since their counts are of other kinds. */
  leftOut: number;
}

/**
 * Every pair of versions of each group tested for one law (equalHistograms), with Holm's adjusted p-values. Pairs of
 * versions share histograms, so their tests depend on each other; Holm's rule holds whatever the dependence.
 *
 * With m pairs in a family no adjusted p can be under m/(resamples + 1): 50 versions make 1225 pairs.
 *
 * @param groups each with its versions in order; a version that lacks a group is left out of it
 * @throws BadInput when a version is named twice in a group, or has no shots
 *
 * Source: Holm 1979, Scand. J. Statist. 6:65.
 */
export async function comparePairs(
  groups: readonly { group: string; versions: readonly { version: string; histogram: Histogram }[] }[],
  { resamples, seed, family = 'group', alike = () => true }: PairsOptions,
  pace: Pace = unbroken
): Promise<PairsReport> {
  const found: Omit<PairTest, 'pAdjusted'>[][] = [];
  const all = groups.reduce((sum, { versions: { length } }) => sum + (length * (length - 1)) / 2, 0);
  let comparison = 0;
  for (const { group, versions } of groups) {
    if (new Set(versions.map(({ version }) => version)).size < versions.length)
      throw new BadInput(`A version stands twice in group ${group}.`);
    const tests: Omit<PairTest, 'pAdjusted'>[] = [];
    for (let i = 0; i < versions.length; i++) {
      for (let j = i + 1; j < versions.length; j++) {
        const [a, b] = [versions[i], versions[j]];
        comparison += 1;
        if (!alike(group, a.version, b.version)) continue;
        const test = equalHistograms(a.histogram, b.histogram, {
          resamples,
          seed,
          comparison: comparison - 1
        });
        tests.push({ group, first: a.version, second: b.version, ...test });
        await pace.breathe(comparison / all);
      }
    }
    found.push(tests);
  }
  const families = family === 'all' ? [found.flat()] : found;
  return {
    family:
      family === 'all'
        ? 'Adjusted by Holm over all pairs of versions of all groups together.'
        : 'Adjusted by Holm over the pairs of versions of each group by itself; not over the groups.',
    leftOut: all - found.flat().length,
    tests: families.flatMap((tests) => {
      const adjusted = holm(tests.map(({ p }) => p));
      return tests.map((test, i) => ({ ...test, pAdjusted: adjusted[i] }));
    })
  };
}
