import { formatNumber } from '../words/format-number';
import { sayInterval } from '../words/say-interval';
import { LEAST_CHANCE } from './floor-chance';
import { misreadCaution } from './misread-caution';
import { mixedCaution } from './mixed-caution';
import { sayChance } from './say-chance';
import { sayLoss } from './say-loss';
import type { SweepReport } from './types';

type Found = Omit<SweepReport, 'statement' | 'because' | 'cautions'>;

/** The answer of a sweep in words: what the power laws say, why, and what they cannot tell. */
export function sweepWords(found: Found): Pick<SweepReport, 'statement' | 'because' | 'cautions'> {
  return { statement: statementOf(found), because: becauseOf(found), cautions: cautionsOf(found) };
}

/** A chance below what a number can hold is told as what it is below. */
const thinP = (p: number) => `p ${p <= LEAST_CHANCE ? '' : '= '}${sayChance(p)}`;

function statementOf({ laws, alpha, points }: Found): string {
  if (!laws) return `No power law can be fitted: ${whyNone(points)}.`;
  const { common, quantities, p } = laws;
  const names = quantities === 3 ? 'mean, variance and third cumulant' : 'mean and variance';
  if (p !== null && p <= alpha)
    return `No power laws hold in this window: ${names} leave them by more than chance allows (${thinP(p)}).${common.p <= alpha ? ` One exponent for all is refused as well (${thinP(common.p)}).` : ''}`;
  if (common.p <= alpha)
    return `One exponent for ${names} is refused (${thinP(common.p)}): separate exponents fit, one does not.`;
  return `One exponent, ${sayInterval(common.exponent)}, serves ${names}, within their errors (${thinP(common.p)}).`;
}

function whyNone(points: Found['points']): string {
  const held = points.filter(({ inWindow, cumulants }) => inWindow && cumulants);
  if (held.length === 0)
    return 'no dataset in the window takes four different counts, and fewer tell no errors';
  return new Set(held.map(({ time }) => time)).size < 2
    ? 'the datasets of the window that take four different counts, as errors need, are all of one time'
    : 'in the window the variance is not known to be positive';
}

function becauseOf(found: Found): string[] {
  const { laws, expected, steady, points, alpha } = found;
  const lines: string[] = [];
  if (laws) {
    const each = laws.exponents.map((one, q) => `κ${'₁₂₃'[q]}: ${sayInterval(one)}`).join('; ');
    lines.push(`Exponents one by one: ${each}.`);
    const { chiSquare, freedom, p, z } = laws.common;
    if (z !== undefined)
      lines.push(
        `Tying them costs χ² = ${formatNumber(chiSquare)} with ${freedom} ${freedom === 1 ? 'degree' : 'degrees'} of freedom (${thinP(p)}), as rare as an error of ${formatNumber(z, 2)} standard errors.`
      );
    if (laws.p === null) lines.push('With two datasets any power law fits: a third would test it.');
    if (laws.quantities < 3)
      lines.push(
        points.some(({ inWindow, cumulants }) => inWindow && cumulants && cumulants[2].high < 0)
          ? 'The third cumulant is below 0 at some times, errors allowed for, so it follows no power law: it is left out.'
          : 'The third cumulant allows no power law: it is too poorly known, or close to 0 or below it. It is left out.'
      );
  }
  if (laws && expected)
    lines.push(
      `A transition with d = ${expected.dimension}, ν = ${expected.correlation}, z = ${expected.dynamic} gives dν/(1 + zν) = ${formatNumber(expected.exponent)}, which the 95\u202f% interval ${expected.inside ? 'holds' : 'does not hold'}.`
    );
  for (const { id, steady: value, p } of steady)
    lines.push(`${NAMES[id]} over the window: ${sayInterval(value)}${sayChange(p, alpha)}.`);
  lines.push(...sayLoss(found));
  const out = points.filter(({ cumulants }) => !cumulants).map(({ label }) => `“${label}”`);
  if (out.length > 0)
    lines.push(`Left out, since fewer than four different counts tell no errors: ${out.join(', ')}.`);
  return lines;
}

const NAMES = {
  'variance-over-mean': 'κ₂/κ₁',
  'third-over-mean': 'κ₃/κ₁',
  'pair-factor': 'F₂/F₁²'
} as const;

const sayChange = (p: number | null, alpha: number): string =>
  p === null
    ? ''
    : p <= alpha
      ? `, but it is not the same at every time (${thinP(p)})`
      : `, the same at every time within errors (${thinP(p)})`;

/** Shots under which the errors of a dataset are themselves too poorly known. */
const FEW_SHOTS = 300;

function cautionsOf({ laws, steady, unit, axis, points, mixed }: Found): string[] {
  const lines = [
    'A power law in a window does not say which physics made it: plateaus at the fast end and a background at the slow end end it, so look how the exponent moves with the window.'
  ];
  const agreeing = steady.filter(({ references }) =>
    references.some(({ id, inside }) => inside && id !== 'rare-events')
  );
  if (agreeing.length > 0)
    lines.push(
      `Ratios of cumulants cannot tell Landau–Zener kinks (0.586, 0.134) from coarsening of a chain from zero temperature (0.584 ± 0.004, 0.146 ± 0.044)${unit === 'pair' ? '; counted in pairs they are half and a quarter of these' : ''}.`
    );
  if (laws && laws.common.p <= 0.05)
    lines.push(
      'What ends a common exponent may be loss or annihilation after the quench, a background, misreads or drift: the cumulants alone do not say which.'
    );
  const few = points.filter(({ inWindow, cumulants, shots }) => inWindow && cumulants && shots < FEW_SHOTS);
  if (few.length > 0)
    lines.push(
      `${few.length} of the datasets in the window ${few.length === 1 ? 'has' : 'have'} fewer than ${FEW_SHOTS} shots, and errors that are poorly known themselves: p-values come out too small. In simulated sweeps of nine datasets with 100 shots each, one exponent was refused at the level 0.05 in 15 of 100, and power laws in 13.`
    );
  if (axis === 'hold-time')
    lines.push(
      'Well-mixed annihilation of pairs, A + A → 0, takes the variance to two thirds of the mean while many are left; correlated or confined defects need not.'
    );
  return [...lines, ...mixedCaution(mixed), ...misreadCaution(points)];
}
