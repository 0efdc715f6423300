import type { Quotable } from '../quotable';
import { SOURCES_BY_YEAR } from '../sources';
import { math, text, words, type Words } from '../span';
import { counted } from './say-number';
import { sayMisread } from './say-misread';
import { testedTrials } from './units';

/** What the divergence is; nothing where it is kept back. */
export function sayDistance({ fit }: Quotable): Words[] {
  if (!fit.divergence) return [];
  const gSquared = fit.gSquared === null ? '' : words`, with ${math('G² = 2SD')} for ${math('S')} shots`;
  const corrected =
    fit.divergence.high === null
      ? ''
      : words`; ${math('D')} is quoted with its mean over resamples from the law taken off, and with a normal 95\u202f% interval`;
  return [
    words`The distance of the counts from this law is the Kullback–Leibler divergence ${math('D')} of the observed shares from it, in nats a shot${gSquared}${corrected}.`
  ];
}

/** What the variance was compared with, and where its interval comes from; nothing where the counts have no spread. */
export function sayScatter(quotable: Quotable): Words[] {
  const { data, engine, moments } = quotable;
  if (moments.variance.value === null || moments.variance.value === 0) return [];
  if (moments.mean.low === null) return [ceiling(quotable)];
  const from =
    engine.resamples === null ? '' : words` from ${counted(engine.resamples, 'resample')} of the histogram`;
  return [
    ceiling(quotable),
    words`The 95\u202f% intervals of mean, variance and variance over ceiling are bootstrap-t${from} (${SOURCES_BY_YEAR.efronTibshirani}); those of the variance are never narrower than Fisher’s index of dispersion gives, nor than one unseen count could make them${data.lump || data.opening ? ', and hold for the counts as lumped' : ''}.`
  ];
}

function ceiling(quotable: Quotable): Words {
  if (quotable.data.misreadApplied)
    return words`The variance was compared with its ceiling, the largest ${quotable.data.geometry === 'ring-bonds' ? 'found for independent kinks round a ring with this mean' : 'that independent kinks with this mean can have'}${sayMisread(quotable)}${quotable.data.lump || quotable.data.opening ? ' and lumped in the same way' : ''}.`;
  if (quotable.data.lump || quotable.data.opening)
    return [
      text(
        'The variance was compared with its ceiling, that of equal trials with the fitted mean, lumped in the same way.'
      )
    ];
  const largest =
    testedTrials(quotable) === null
      ? words`${math('μ')}, the mean`
      : words`${math(quotable.data.unit === 'pair' ? 'μ(1 − 2μ/N)' : 'μ(1 − μ/N)')} with ${math('μ')} the mean`;
  return words`The variance was compared with its ceiling, the largest that independent trials can have: ${largest}.`;
}
