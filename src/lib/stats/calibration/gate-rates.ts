import { binomialSample } from '../random/binomial-sample';
import { generator } from '../random/generator';
import { gateReport } from '../versions/gate-report';
import type { GateReport, GateRule, VersionCell } from '../versions/types';
import { shotsOf } from './shots-of';
import { betaBinomial } from './violations/common-cause';

const GROUPS = ['a', 'b', 'c', 'd', 'e', 'f', 'g', 'h'];
const [TRIALS, MEAN] = [64, 0.1];

export interface GateCase {
  runs: number;
  /** Of each group in each version. */
  shots: number;
  /** Versions beside the reference in each run. */
  versions: number;
  /** Variance of the first group of each version over its ceiling; 1 for no change at all. */
  rise: number;
  tolerance: number;
  alpha: number;
  seed: number;
}

/** How simulated gates end: of versions, and of runs those in which any version fails. */
export interface GateRates {
  failed: number;
  undecided: number;
  passed: number;
  anyFailed: number;
}

/** Gates of simulated versions: eight groups of 64 equal trials, the first with variance `rise` times its ceiling. */
export function gateRates({ runs, shots, versions, rise, tolerance, alpha, seed }: GateCase): GateRates {
  const rates: GateRates = { failed: 0, undecided: 0, passed: 0, anyFailed: 0 };
  const rule: GateRule = { reference: '0', tolerance, alpha, groups: null };
  for (let run = 0; run < runs; run++) {
    const outcomes = new Set<GateReport['outcome']>();
    const reference = cells('0', 0);
    for (let version = 1; version <= versions; version++) {
      const { outcome } = gateReport(rule, String(version), [
        ...reference,
        ...cells(String(version), version)
      ]);
      rates[outcome]++;
      outcomes.add(outcome);
    }
    if (outcomes.has('failed')) rates.anyFailed++;

    function cells(name: string, version: number): VersionCell[] {
      return GROUPS.map((group, g) => {
        const random = generator(seed, (run * (versions + 1) + version) * GROUPS.length + g);
        const crossed = version > 0 && g === 0 && rise > 1;
        const { counts } = crossed
          ? betaBinomial(random, shots, TRIALS, MEAN, (rise - 1) / (TRIALS - 1)) // variance 1 + 63ρ ceilings
          : shotsOf(shots, () => binomialSample(random, TRIALS, MEAN));
        const histogram = { kind: 'histogram' as const, counts, lump: null };
        const at = { group, version: name, label: group };
        return { ...at, histogram, trials: TRIALS, unit: 'defect', geometry: 'sites' };
      });
    }
  }
  const of = runs * versions;
  return {
    failed: rates.failed / of,
    undecided: rates.undecided / of,
    passed: rates.passed / of,
    anyFailed: rates.anyFailed / runs
  };
}
