import type { Diagnosis } from '$lib/stats/types';
import { formatCount } from '$lib/model/format-number';

/** The finding of the tails, as a title: what the certificate or the two tail tests say. */
export function tailsTitle({ tails, tests, engine, data }: Diagnosis): string {
  const { certificate } = tails;
  const unit = data.unit === 'pair' ? 'pairs' : 'defects';
  if (certificate && certificate.p <= engine.alpha)
    return (
      `Too many shots with ${formatCount(certificate.count)} ${unit} or ${certificate.side === 'high' ? 'more' : 'fewer'} ` +
      'for any independent trials'
    );
  const heavy = tests.filter((test) => test.id.endsWith('-tail') && test.pAdjusted <= engine.alpha);
  if (heavy.length > 1) return 'Both tails are heavier than the best independent-trial law';
  if (heavy.length)
    return `The ${heavy[0].id === 'high-tail' ? 'high' : 'low'} tail is heavier than the best independent-trial law`;
  if (!tails.points.length) return 'These counts have no tails to compare';
  return 'Neither tail is heavier than the best independent-trial law explains';
}
