import type { Diagnosis, Unit } from '$lib/stats/types';
import { formatCount } from '$lib/model/format-number';

const WORDS: Record<Unit, [one: string, many: string]> = {
  defect: ['defect', 'defects'],
  pair: ['pair', 'pairs']
};

/** "12 defects or more", "1 defect or fewer", and "no defects": there are no fewer than none. */
function sayTail(count: number, side: 'low' | 'high', unit: Unit): string {
  const [one, many] = WORDS[unit];
  if (side === 'low' && count === 0) return `no ${many}`;
  return `${formatCount(count)} ${count === 1 ? one : many} or ${side === 'high' ? 'more' : 'fewer'}`;
}

/** The finding of the tails, as a title: what the certificate or the two tail tests say. */
export function tailsTitle({ tails, tests, engine, data }: Diagnosis): string {
  const { certificate } = tails;
  if (certificate && certificate.p <= engine.alpha)
    return `Too many shots with ${sayTail(certificate.count, certificate.side, data.unit)} for any independent trials`;
  const heavy = tests.filter((test) => test.id.endsWith('-tail') && test.pAdjusted <= engine.alpha);
  if (heavy.length > 1) return 'Both tails are heavier than the best independent-trial law';
  if (heavy.length)
    return `The ${heavy[0].id === 'high-tail' ? 'high' : 'low'} tail is heavier than the best independent-trial law`;
  if (!tails.points.length) return 'These counts have no tails to compare';
  return 'Neither tail is heavier than the best independent-trial law explains';
}
