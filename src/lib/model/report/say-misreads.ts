import { capital } from '../capital';
import { sayRate } from '$lib/stats/words/say-rate';
import type { Diagnosis, Interval, Level } from '$lib/stats/types';
import { formatNumber, formatPercent } from '../format-number';
import { GEOMETRIES } from '../labels';
import { sayFlagged } from './say-flagged';

/** What the words on misreads are made of: a document, or what a link without counts leaves of it. */
export interface MisreadsView extends Pick<Diagnosis, 'flags'> {
  data: Pick<Diagnosis['data'], 'geometry' | 'misread' | 'misreadUncertainty'>;
  nuisances?: { misread?: { applied: boolean; neededRate: Interval } };
}

/** What was stated of misread sites, whether the report allows for it, and what they do to counts. */
export function sayMisreads(view: MisreadsView): string {
  const { misread, geometry } = view.data;
  const unsure = view.data.misreadUncertainty
    ? `, with a standard uncertainty of ${formatPercent(view.data.misreadUncertainty)}`
    : '';
  const chance =
    misread === null
      ? 'The chance to misread a site is not stated, and none is allowed for.'
      : `The chance to misread a site is stated as ${sayRate(misread)}${unsure}${allowed(view)}.`;
  const effect =
    geometry === 'sites'
      ? 'On sites that are read one by one, independent misreads keep counts a sum of independent trials.'
      : 'On bonds one misread site toggles the two bonds beside it, so that independent defects can look bunched.';
  return `Counted on: ${GEOMETRIES[geometry]}. ${chance} ${effect}${sayFlagged(view, 'misreads')}`;
}

function allowed({ data, nuisances }: MisreadsView): string {
  if (nuisances?.misread?.applied) return ', and every test, bound and flag allows for it';
  return data.misread && data.geometry !== 'sites'
    ? '; it is not allowed for, and the tests are against laws without misreads'
    : '';
}

/** The misread rate that would explain the variance by itself, to hold against the calibration; null where none is told. */
export function sayNeededRate({ nuisances }: MisreadsView): string | null {
  if (!nuisances?.misread) return null;
  const { value, low, high } = nuisances.misread.neededRate;
  const calibration = 'To compare with your calibration';
  const from = low === null ? '' : ` The lower limit of the variance asks for ${rateOf(low)}`;
  if (value === null)
    return `${calibration}: the variance seen takes more than misreads can give, or it has no value here.${from && `${from}.`}`;
  if (value === 0)
    return `${calibration}: none. The variance is under the ceiling without misreads; its upper limit would need ${high === null ? 'more than misreads can give' : rateOf(high)}.`;
  const limits =
    low === null && high === null
      ? 'no limits can be given'
      : `95\u202f%: ${low === null ? 'no lower limit' : rateOf(low)} to ${high === null ? 'more than misreads can give' : rateOf(high)}, from the limits of the variance`;
  return `${calibration}: ${rateOf(value)} of the sites would by themselves give this variance (${limits}). A rate below the lower limit is too small to explain the excess.`;
}

/** The answer over the interval of a rate with an uncertainty; null where none was stated. */
export const sayRateSpread = ({ nuisances }: Diagnosis): string | null =>
  nuisances?.misread?.spread?.statement ?? null;

/** The largest rate that the counts allow; null where they allow any, and in documents before engine 0.6. */
export function sayLargestRate({ nuisances }: Diagnosis): string | null {
  const largest = nuisances?.misread?.largestRate;
  return largest === undefined || largest >= 0.5
    ? null
    : `At most ${formatPercent(largest, 3)} of the sites can have been misread: a larger rate would by itself show more kinks, or hide more, than were read, five standard errors allowed for.`;
}

const rateOf = (rate: number): string => (rate === 0 ? 'none' : formatPercent(rate));

/** The two ceilings side by side; null unless misreads are allowed for. */
export function sayTwoCeilings({ nuisances, moments }: Diagnosis): string | null {
  const misread = nuisances?.misread;
  if (!misread?.applied) return null;
  const { ceiling, rawCeiling, rawDispersion } = misread;
  const times = (over: number | null) => (over === null ? '–' : formatNumber(over));
  return `With misreads ${formatNumber(ceiling)}, without ${formatNumber(rawCeiling)}. The variance is ${times(moments.dispersion.value)} times the first and ${times(rawDispersion)} times the second; the report judges it by the first.`;
}

/** Stretches of bonds told at most: the document has them all. */
export const MOST_STRETCHES = 6;

/** Fitted probabilities along the chain before any misread; null unless misreads are allowed for. */
export function sayKinks({ nuisances }: Diagnosis): string | null {
  const kinks = nuisances?.misread?.kinks;
  if (!kinks || kinks.length === 0) return null;
  const stretches = kinkStretches(kinks);
  const more =
    stretches.length > MOST_STRETCHES ? `; the document has all ${stretches.length} stretches` : '';
  return `Probability of a kink before any misread, as fitted. ${capital(stretches.slice(0, MOST_STRETCHES).join('; '))}${more}. The counts hardly tell one order of the bonds from another.`;
}

/** "bonds 3 to 7: 0.0497", one for each stretch of bonds with the same probability, in their order. */
export function kinkStretches(kinks: Level[]): string[] {
  let bond = 0;
  return kinks.map(({ p, trials }) => {
    const first = bond + 1;
    bond += trials;
    return `${first === bond ? `bond ${first}` : `bonds ${first} to ${bond}`}: ${formatNumber(p)}`;
  });
}
