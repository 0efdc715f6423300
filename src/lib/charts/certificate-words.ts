import { formatCount, formatNumber } from '$lib/model/format-number';
import { sayHowOften } from '$lib/model/say-p';
import type { Diagnosis } from '$lib/stats/types';
import { sayShare } from './say-share';

/** The exact certificate in words: it rests on no fit and no simulation. '' without one. */
export function certificateWords({ tails, data }: Diagnosis): string {
  const { certificate } = tails;
  if (!certificate) return '';
  const side = certificate.side === 'high' ? 'more' : 'fewer';
  return (
    `The most telling tail: ${formatCount(certificate.shots)} of ${formatCount(data.shots)} shots had ` +
    `${formatCount(certificate.count)} or ${side}. Independent trials with a mean of ` +
    `${formatNumber(certificate.mean, 4)}, the unfavourable end of its interval, give at most ` +
    `${sayShare(certificate.bound)} a shot. With all ${formatCount(certificate.thresholds)} counts tried allowed for, so ` +
    `heavy a tail ${sayHowOften(certificate.p, certificate.p)} (exact certificate, p ≤ ${formatNumber(certificate.p, 2)}).`
  );
}
