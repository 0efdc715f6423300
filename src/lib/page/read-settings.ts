import { readKept } from '$lib/model/read-kept';
import { SETTING_WORDS } from '$lib/model/setting-words';
import type { DiagnoseOptions } from '$lib/stats/types';
import { readNumber } from './read-number';
import type { SettingName, Settings } from './settings';

export type SettingProblems = Partial<Record<SettingName, string>>;
export type SettingsRead = { ok: true; options: DiagnoseOptions } | { ok: false; problems: SettingProblems };

/** Trials as typed: null for unknown, undefined for what is neither a number nor "unknown". */
export function readTrials(typed: string): number | null | undefined {
  const word = typed.trim().toLowerCase();
  if (word === '' || word === 'unknown') return null;
  const value = readNumber(word);
  return value !== null && Number.isInteger(value) && value >= 1 && value <= 1e9 ? value : undefined;
}

type LawRead = { ok: true; probabilities: number[] } | { ok: false; problem: string };

/** The supplied law has a reader of its own, which is fetched only when there is a law to read. */
async function readLaw(typed: string): Promise<LawRead> {
  if (typed.trim() === '') return { ok: true, probabilities: [] };
  const { readProbabilities } = await import('$lib/formats/read-probabilities');
  const result = readProbabilities(typed);
  if (result.ok) return result;
  const [{ line, message, fix }] = result.problems;
  return { ok: false, problem: `${line === null ? '' : `Line ${line}: `}${message} ${fix}` };
}

/** Turns the fields into options, or says of each field what is wrong. Nothing typed is changed. */
export async function readSettings(settings: Settings): Promise<SettingsRead> {
  const problems: SettingProblems = {};
  const number = (name: SettingName, fits: (value: number) => boolean, problem: string): number => {
    const value = readNumber(settings[name]);
    if (value !== null && fits(value)) return value;
    problems[name] = problem;
    return NaN;
  };

  const trials = readTrials(settings.trials);
  if (trials === undefined) problems.trials = 'Write a whole number from 1 to 1 000 000 000, or “unknown”.';
  const kept = settings.kept.trim() === '' ? null : readKept(settings.kept);
  if (kept === null && settings.kept.trim() !== '') problems.kept = SETTING_WORDS.kept;
  const law = await readLaw(settings.supplied);
  if (!law.ok) problems.supplied = law.problem;
  const whole = Number.isInteger;
  const unsure =
    settings.misreadUncertainty.trim() === ''
      ? null
      : number('misreadUncertainty', (x) => x >= 0 && x < 0.5, SETTING_WORDS.misreadUncertainty);
  if (unsure !== null && settings.misread.trim() === '')
    problems.misreadUncertainty = SETTING_WORDS.uncertaintyAlone;
  const options: DiagnoseOptions = {
    trials: trials ?? null,
    unit: settings.unit,
    geometry: settings.geometry,
    misread:
      settings.misread.trim() === ''
        ? null
        : number('misread', (x) => x >= 0 && x < 0.5, SETTING_WORDS.misread),
    ...(unsure !== null && { misreadUncertainty: unsure }),
    ...(kept && { kept }),
    alpha: number('alpha', (x) => x > 0 && x < 0.5, 'Write a level between 0 and 0.5, such as 0.01.'),
    tolerance: number(
      'tolerance',
      (x) => x > 0 && x <= 10,
      'Write a fraction above 0 and up to 10, such as 0.1.'
    ),
    resamples: number(
      'resamples',
      (x) => whole(x) && x >= 19 && x <= 1e6,
      'Write a whole number from 19 to 1 000 000, such as 1999.'
    ),
    seed: number(
      'seed',
      (x) => whole(x) && x >= 0 && x < 2 ** 32,
      'Write a whole number from 0 to 4 294 967 295.'
    ),
    supplied: law.ok && law.probabilities.length ? law.probabilities : null
  };
  return Object.keys(problems).length ? { ok: false, problems } : { ok: true, options };
}
