import { lawMoments, type Cumulants } from '../laws/law-moments';
import type { Generator } from '../random/generator';
import type { CountData } from '../types';
import { lawDraws } from './law-draws';
import type { Truth } from './truth';
import type { Violation } from './violation';

/** Something to draw shots from, with what the diagnosis is told, and the cumulants it should cover. */
export interface Setting {
  id: string;
  trials: number | null;
  draw(random: Generator, shots: number): CountData;
  /** Cumulants of the law behind the shots; null when it is no independent-trial law. */
  cumulants: Cumulants | null;
}

/** A true independent-trial law as a setting. */
export function truthSetting(truth: Truth): Setting {
  return {
    id: truth.id,
    trials: truth.trials,
    draw: lawDraws(truth.law),
    cumulants: lawMoments(truth.law)
  };
}

/** A violation of one strength as a setting. */
export function violationSetting(violation: Violation, strength: number): Setting {
  return {
    id: `${violation.id} ${strength}`,
    trials: violation.trials,
    draw: (random, shots) => violation.draw(random, shots, strength),
    cumulants: null
  };
}
