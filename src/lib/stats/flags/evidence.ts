import type { DriftPart } from '../drift/types';
import type { MisreadUse } from '../nulls/misread-applies';
import type { RateSpread } from '../rate-interval/types';
import type { Certificate, DiagnoseOptions, Diagnosis, TestId, TestResult } from '../types';

/** All that flags and the answer are decided from. */
export interface Evidence {
  options: DiagnoseOptions;
  shots: number;
  trials: number | null;
  /** Two counts only: their mean says what their variance is (meanFixesVariance). */
  fixed?: boolean;
  /** With a declared cut: how variance over ceiling scatters (keptShape), and the largest excess that fits into the cut. */
  cut?: { shape: number | null; most: number };
  /** With misreads allowed for, ceiling and dispersion are those of kinks as read. */
  moments: Omit<Diagnosis['moments'], 'criticalTrials'>;
  /** Whether every test allows for misread sites; left out, none was stated. */
  misread?: MisreadUse;
  /** Where the misread rate has an uncertainty: tests and certificate are then the worst over it. */
  rates?: RateSpread;
  /** What order and batches say of the excess; left out for histograms. */
  drift?: DriftPart;
  tests: TestResult[];
  certificate: Certificate | null;
  /** p of the low tail with empty shots set aside; null when it was not asked. */
  lowTailOfTheRest: number | null;
  /** How neighbouring shots relate, from the number of runs; null without order. */
  neighbours: 'alike' | 'alternating' | null;
  /** Empty shots seen, and expected by the law of the others (null when that says nothing). */
  empty: { seen: number; expected: number | null };
  /** Shots with an even count, and the share the fitted law expects; null with a lump. `oneCountAlone`: the preference goes when one count is left out. */
  even: { seen: number; expected: number; oneCountAlone: boolean } | null;
}

export type Grade = 'shown' | 'hinted' | null;

/** Adjusted p from which a flag is hinted at. */
const hint = 0.05;

/** Shown at the level of the answer (a certificate shows its tail), hinted at 5 %, after adjustment for all tests that ran. */
export function gradeOf(evidence: Evidence, id: TestId): Grade {
  const { certificate, options } = evidence;
  if (certificate && certificate.p <= options.alpha && id === `${certificate.side}-tail`) return 'shown';
  const test = evidence.tests.find((one) => one.id === id);
  if (!test) return null;
  if (test.pAdjusted <= evidence.options.alpha) return 'shown';
  return test.pAdjusted <= hint ? 'hinted' : null;
}

/** The stronger of two grades. */
export function stronger(a: Grade, b: Grade): Grade {
  return a === 'shown' || b === 'shown' ? 'shown' : (a ?? b);
}

/** Shots with an odd count where kinks are counted singly round a ring, which gives none; 0 elsewhere and with a lump. */
export const oddOnRing = ({ options, even, shots }: Pick<Evidence, 'options' | 'even' | 'shots'>): number =>
  options.geometry === 'ring-bonds' && options.unit === 'defect' && even ? shots - even.seen : 0;

/** Whether kinks on a ring are tested as pairs: single ones that are independent keep to about half that ceiling. */
export const pairsOnRing = ({ options }: Pick<Evidence, 'options'>): boolean =>
  options.geometry === 'ring-bonds' && options.unit === 'pair';

/** Whether the law tested is of kinks round a ring as they are read: it gives even counts only. */
export const ringAsRead = ({ options, misread }: Pick<Evidence, 'options' | 'misread'>): boolean =>
  options.geometry === 'ring-bonds' && misread?.applies === true;

/** True when every shot had an even count, as kinks on a ring do by construction, and the law tested does not say so. */
export function allEven(evidence: Evidence): boolean {
  return (
    !ringAsRead(evidence) &&
    evidence.even !== null &&
    evidence.even.seen === evidence.shots &&
    evidence.moments.variance.value !== 0
  );
}
