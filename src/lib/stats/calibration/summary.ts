import { testIds } from '../test-ids';
import { COVERED, type Outcome, type PName } from './outcome';
import { share, type Share } from './share';

/** Many repeats of one setting at one number of shots. */
export interface Summary {
  setting: string;
  shots: number;
  repeats: number;
  /**
   * Share of repeats with p ≤ 0.05, of all repeats: a test that had nothing to look at raised no alarm. Tests
   * that never ran are left out.
   */
  alarms: Partial<Record<PName, Share>>;
  /** Share of whole answers "ruled out" at α = 0.01 and 0.05. */
  ruledOut: { '0.01': Share; '0.05': Share };
  compatible: Share;
  undecided: Share;
  flagged: Share;
  coverage: Record<(typeof COVERED)[number], Share> | null;
}

const NAMES: PName[] = [...testIds, 'certificate', 'within-batches', 'empty-aside'];

/** Shares over the repeats of one setting, each with its exact interval. */
export function summary(setting: string, shots: number, outcomes: Outcome[]): Summary {
  const count = (test: (outcome: Outcome) => boolean) =>
    share(outcomes.filter((outcome) => test(outcome)).length, outcomes.length);
  const alarms: Summary['alarms'] = {};
  for (const name of NAMES) {
    const ran = outcomes.map(({ p }) => p[name]).filter((p) => p !== undefined);
    // The slack is for p-values such as 20/400 that are not exact in binary.
    if (ran.length > 0) alarms[name] = share(ran.filter((p) => p <= 0.05 + 1e-12).length, outcomes.length);
  }
  const covered = outcomes.map((outcome) => outcome.covered).filter((one) => one !== null);
  const coverage = (name: (typeof COVERED)[number]) =>
    share(covered.filter((one) => one[name]).length, covered.length);
  return {
    setting,
    shots,
    repeats: outcomes.length,
    alarms,
    ruledOut: {
      '0.01': count(({ ruledOutFrom }) => ruledOutFrom <= 0.01),
      '0.05': count(({ ruledOutFrom }) => ruledOutFrom <= 0.05)
    },
    compatible: count(({ verdict }) => verdict === 'compatible'),
    undecided: count(({ verdict }) => verdict === 'undecided'),
    flagged: count(({ flagged }) => flagged),
    coverage:
      covered.length > 0
        ? {
            mean: coverage('mean'),
            variance: coverage('variance'),
            third: coverage('third'),
            fourth: coverage('fourth'),
            dispersion: coverage('dispersion')
          }
        : null
  };
}
