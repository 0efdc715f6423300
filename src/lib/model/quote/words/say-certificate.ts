import type { Quotable } from '../quotable';
import { SOURCES_BY_YEAR } from '../sources';
import { math, words, type Words } from '../span';
import { counted } from './say-number';

/** What the exact certificate is; nothing where there is none. */
export function sayCertificate({ certificate, data }: Quotable): Words[] {
  if (!certificate) return [];
  const interval = data.trials === null ? SOURCES_BY_YEAR.garwood : SOURCES_BY_YEAR.clopperPearson;
  return [
    words`Beside the tests stands an exact certificate, without fit or simulation: the number of shots at or beyond a count is held against the heaviest tail that independent trials can have (${SOURCES_BY_YEAR.hoeffding}), at the unfavourable end of an exact interval for the mean (${interval}) that misses with a chance of one in a million, which is added to ${math('p')} (${SOURCES_BY_YEAR.bergerBoos}); ${counted(certificate.thresholds, 'count')} ${certificate.thresholds === 1 ? 'was' : 'were'} tried, with Bonferroni’s allowance.`
  ];
}
