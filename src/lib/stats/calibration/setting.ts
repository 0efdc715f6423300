import { lawMoments, type Cumulants } from '../laws/law-moments';
import type { Generator } from '../random/generator';
import type { CountData, DiagnoseOptions } from '../types';
import { lawDraws } from './law-draws';
import type { Nuisance } from './nuisance';
import type { Truth } from './truth';
import type { Violation } from './violation';

/** Something to draw shots from, with what the diagnosis is told, and the cumulants it should cover. */
export interface Setting {
  id: string;
  trials: number | null;
  /** What else the diagnosis is told. */
  options?: Partial<DiagnoseOptions>;
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

/** A nuisance that is stated, with an excess of one strength; 0: none. */
export function nuisanceSetting(nuisance: Nuisance, strength: number): Setting {
  return {
    id: strength === 0 ? nuisance.id : `${nuisance.id} ${strength}`,
    trials: nuisance.trials,
    options: nuisance.options,
    draw: (random, shots) => nuisance.draw(random, shots, strength),
    cumulants: null
  };
}
