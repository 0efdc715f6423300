import { formatCount, formatNumber } from '$lib/model/format-number';
import { EFFECTS } from './fields';
import type { Odds, Planned } from './messages';
import type { PlanRequest } from './read-plan';

const inHundred = (share: number): string => `${plain(100 * share, 3)} of 100`;

/** Without the zeros that only say how it was rounded: people typed 0.01. */
const plain = (value: number, digits = 4): string =>
  formatNumber(value, digits)
    .replace(/(\.\d*?)0+$/, '$1')
    .replace(/\.$/, '');

/** The plan in sentences, plain first. */
export function sayPlan(
  { kind, size, shots, power, alpha }: PlanRequest,
  { needed, smallest }: Planned
): string[] {
  const level = `at a level of ${plain(alpha)}`;
  const said: string[] = [];
  if (needed && size !== null)
    said.push(
      needed.shots === null
        ? `No number of shots shows ${name(kind)} of ${plain(size)}.`
        : `${formatCount(needed.shots)} shots show ${name(kind)} of ${plain(size)} in ${inHundred(needed.power)} experiments, ${level}.`
    );
  if (shots !== null && smallest !== undefined)
    said.push(
      smallest === null
        ? `${formatCount(shots)} shots show no ${EFFECTS[kind].short} of any size that can be in ${inHundred(power)} experiments.`
        : `${formatCount(shots)} shots show ${name(kind)} of ${formatNumber(smallest, 3)} or more in ${inHundred(power)} experiments, ${level}.`
    );
  return said.length > 0 ? said : ['An effect of this size cannot be on counts of this mean.'];
}

const name = (kind: PlanRequest['kind']): string =>
  `${kind === 'excess' ? 'an' : 'a'} ${EFFECTS[kind].short}`;

/** A probability, or that it is too small to be told apart from none. */
export const sayOdd = (p: number): string => (p >= 1e-307 ? formatNumber(p, 4) : 'under 10⁻³⁰⁷');

/** The odds of a lucky shot, plain first. */
export function sayOdds(most: number, { lucky, fitted }: Odds): string {
  const few = most === 0 ? 'no defect' : `at most ${formatCount(most)} ${most === 1 ? 'defect' : 'defects'}`;
  const law = fitted ? 'the best independent-trial law of these counts' : 'equal trials of this mean';
  if (lucky.shotsUntil === null) return `Under ${law} a shot with ${few} does not come.`;
  if (lucky.shotsUntil === Infinity)
    return `A shot with ${few} comes less than once in 10³⁰⁷ shots, under ${law}.`;
  if (lucky.exact > 0.5) return `Under ${law} most shots have ${few}: ${inHundred(lucky.exact)}.`;
  return `A shot with ${few} comes once in ${formatNumber(lucky.shotsUntil, 3)} shots, under ${law}.`;
}
