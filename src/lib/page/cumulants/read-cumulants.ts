import { formatCount } from '$lib/model/format-number';
import type { Measured, PublishedCumulants } from '$lib/stats/cumulants-only/published-cumulants';
import { readNumber } from '../read-number';
import { readTrials } from '../read-settings';
import { roundingOf } from './rounding-of';
import type { CumulantField, CumulantFields } from './fields';

export type CumulantProblems = Partial<Record<CumulantField, string>>;
export type CumulantsRead =
  { ok: true; printed: PublishedCumulants } | { ok: false; problems: CumulantProblems };

/** Numbers of a table beyond this are a slip of the pen; their powers would leave the doubles. */
const most = 1e12;

/** Turns the fields into a line of a table, or says of each field what is wrong. Nothing typed is changed. */
export function readCumulants(fields: CumulantFields): CumulantsRead {
  const problems: CumulantProblems = {};
  const number = (name: CumulantField): number => {
    const value = readNumber(fields[name]);
    if (value !== null && Math.abs(value) <= most) return value;
    problems[name] = sayNoNumber(fields[name], name === 'third' || name === 'fourth');
    return NaN;
  };
  const measured = (name: 'mean' | 'variance' | 'third' | 'fourth'): Measured => {
    const value = number(name);
    const field = `${name}-error` as const;
    const rounding = fields[field].trim() === '' ? roundingOf(fields[name]) : null;
    if (rounding !== null && rounding >= 1e-9 * Math.abs(value))
      return { value, error: rounding, rounded: true };
    const error = readNumber(fields[field]);
    if (error === 0)
      problems[field] =
        'An error of 0 would make the number exact, which nothing measured is. Write its standard error, such as 0.04.';
    else if (error === null || !(error > 0 && error <= most && error >= 1e-9 * Math.abs(value || 0)))
      problems[field] =
        'Write its standard error, above 0 and at least a billionth of the number, such as 0.04.';
    return { value, error: error ?? NaN };
  };
  const given = (name: 'third' | 'fourth') =>
    fields[name].trim() !== '' || fields[`${name}-error`].trim() !== '';

  const trials = readTrials(fields.trials);
  if (trials === undefined) problems.trials = 'Write a whole number from 1 to 1 000 000 000, or “unknown”.';
  const printed: PublishedCumulants = {
    trials: trials ?? null,
    mean: measured('mean'),
    variance: measured('variance'),
    third: given('third') ? measured('third') : null,
    fourth: given('fourth') ? measured('fourth') : null
  };
  if (printed.mean.value < 0) problems.mean = 'A mean count is not negative.';
  else if (trials && printed.mean.value > trials)
    problems.mean = `The mean is above N = ${formatCount(trials)}: so many defects have no room in a shot.`;
  if (printed.variance.value < 0)
    problems.variance =
      'No counts have a negative variance. Look for a slip, or for a variance minus the mean.';
  if (printed.fourth && !printed.third)
    problems.third = 'The fourth is of use only with the third: write both.';
  return Object.keys(problems).length ? { ok: false, problems } : { ok: true, printed };
}

function sayNoNumber(typed: string, optional: boolean): string {
  if (/[±(]|\+[/-]/.test(typed))
    return 'Write the number alone, such as 3.87: its standard error has a field of its own.';
  const without = optional ? ' If the table has none, leave it empty, and its error too.' : '';
  if (typed.trim() === '') return `Write a number, such as 3.87.${without}`;
  return `Write a plain number, such as 3.87 or 2.1e-3, up to 10¹² in size.${without}`;
}
