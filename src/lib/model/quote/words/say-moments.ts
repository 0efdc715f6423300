import { lumpWords } from '../../lump-words';
import { roundToDigits } from '../numbers/round-to-digits';
import type { Quotable } from '../quotable';
import { math, number, words, type Words } from '../span';
import { sayRounded } from './say-number';
import { sayMisread } from './say-misread';
import { thing } from './units';

/** Mean, variance, variance over ceiling and divergence, each rounded to its uncertainty. */
export function sayMoments(quotable: Quotable): Words[] {
  const { data, fit, moments } = quotable;
  const { mean, variance, dispersion } = moments;
  const what = `${thing(quotable)}s`;
  const out: Words[] = [];
  if (variance.value === null || variance.value === 0) {
    if (mean.value !== null && mean.value > 0)
      out.push(words`The mean is ${sayRounded(mean)} ${what} a shot.`);
  } else {
    const over =
      dispersion.value === null
        ? []
        : words`, which is ${sayRounded(dispersion)} times the ceiling of ${data.lump || data.opening ? 'equal trials lumped in the same way' : 'independent trials with this mean'}${sayMisread(quotable)}`;
    out.push(
      words`The mean is ${sayRounded(mean)} ${what} a shot and the variance ${sayRounded(variance)}${over}${lumped(quotable)}.`
    );
  }
  if (fit.divergence && variance.value !== null && variance.value > 0) {
    const hasInterval = fit.divergence.high !== null;
    const found =
      fit.gSquared === null
        ? []
        : words`${hasInterval ? '; as found, ' : '; '}${math('G²')} is ${number(roundToDigits(fit.gSquared, 4))}`;
    out.push(
      words`${data.misreadApplied ? 'The best law found of independent kinks so read' : 'The best independent-trial law'} lies ${sayRounded(fit.divergence, 'D')} nats a shot from the counts${hasInterval ? ', chance taken off' : ''}${found}.`
    );
  }
  return out;
}

function lumped({ data }: Quotable): string {
  if (!data.lump && !data.opening) return '';
  const { limits } = lumpWords({ above: data.lump !== null, below: data.opening !== null });
  const which = data.lump && data.opening ? 'smallest and largest' : data.opening ? 'smallest' : 'largest';
  return `; ${limits}, since the ${which} counts were lumped`;
}
