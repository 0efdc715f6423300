import type { CumulantsVerdict } from './judge-cumulants';
import type { Condition } from './condition';
import { formatNumber } from '../words/format-number';
import { sayHowOften } from '../words/say-p';

const NAMES = ['mean', 'variance', 'third cumulant', 'fourth cumulant'];

/** Nobody's errors are normal so far out that a smaller chance could be told. */
const surest = 1e-9;

/** "the variance is above its ceiling". */
export const sayBroken = ({ order, side }: Condition): string =>
  `the ${NAMES[order - 1]} is ${side === 'floor' ? 'below its floor' : 'above its ceiling'}`;

/** The answer in one or two sentences, plain first. */
export function sayCumulants(judged: CumulantsVerdict): string {
  return said(judged) + sayMisprint(judged) + sayRounding(judged);
}

/** What no counts have as printed, though within the errors some do. */
function sayMisprint({ verdict, broken }: CumulantsVerdict): string {
  if (verdict === 'impossible' || broken.length === 0) return '';
  return ` As printed no counts at all have them: ${sayBroken(broken[0])} for any counts, though by less than three of its errors.`;
}

/** Which errors were not printed, and what stands for them. */
function sayRounding({ rounded, verdict }: CumulantsVerdict): string {
  if (rounded.length === 0) return '';
  const names = rounded.map((order) => NAMES[order - 1]);
  const listed =
    names.length > 1 ? `${names.slice(0, -1).join(', ')} and ${names[names.length - 1]}` : names[0];
  const scatter =
    verdict === 'impossible'
      ? ''
      : ' That is not how far the shots scatter: with the standard errors it can be told what chance does.';
  return ` No error was given for the ${listed}, so half a unit of the last digit typed is taken, as rounding leaves it.${scatter}`;
}

function said({
  verdict,
  conditions,
  broken,
  dispersion,
  nearest,
  settled,
  pulls,
  p,
  rounded,
  reaches
}: CumulantsVerdict): string {
  if (verdict === 'impossible') {
    const worst = broken.reduce((a, b) => (b.slack / b.error < a.slack / a.error ? b : a));
    return (
      `No counts at all have these cumulants, independent or not: ${sayBroken(worst)} for any counts, by ${formatNumber(-worst.slack / worst.error, 2)} of its errors. ` +
      `Look for a misprint, ${pulls.length < 4 ? 'or a standard deviation where a variance belongs.' : 'a standard deviation where a variance belongs, or a fourth central moment where a cumulant belongs.'}`
    );
  }
  const first = conditions.find(({ standing }) => standing === 'broken');
  if (verdict === 'ruled-out') {
    const how = first ? `: ${sayBroken(first)}` : '';
    return `No independent trials have these cumulants${how}. If some did, errors so large ${sayHowOften(Math.max(p, surest), 1)}.`;
  }
  if (!settled)
    return 'The errors are of such different sizes that the distance of these cumulants from independent trials cannot be worked out in sixteen digits. Look for a slip in the smallest of them.';
  if (rounded.length > 0) {
    if (nearest.distance === 0)
      return 'Some independent trials can have these cumulants as they are printed.';
    if (reaches === null)
      return 'Some independent trials may have had these cumulants before they were rounded: as printed they lie outside, and whether rounding alone can do that is too close to tell.';
    return reaches
      ? 'Some independent trials may have had these cumulants before they were rounded: as printed they lie outside, by no more than rounding can do.'
      : `As printed, rounding allowed for, these cumulants lie outside what independent trials can have${first ? `: ${sayBroken(first)}` : ''}. If they are exact, no independent trials have them.`;
  }
  const where =
    nearest.distance === 0
      ? 'Some independent trials can have these cumulants'
      : `Within their errors some independent trials can have these cumulants; as printed they lie outside, by ${formatNumber(nearest.distance, 2)} of their errors: chance does that`;
  if (dispersion.value === null)
    return `${where}. But this mean leaves no room for a variance, so there is no ceiling to measure an excess against.`;
  return verdict === 'compatible'
    ? `${where}, and the variance is known well enough that an excess of 10\u202f% over its ceiling would show.`
    : `${where}. But the variance is not known well enough to exclude an excess of 10\u202f% over its ceiling.`;
}
