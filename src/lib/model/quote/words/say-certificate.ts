import type { Quotable } from '../quotable';
import { SOURCES_BY_YEAR } from '../sources';
import { math, words, type Words } from '../span';
import { sayMisread } from './say-misread';
import { counted } from './say-number';

/** What the exact certificate is; nothing where there is none. */
export function sayCertificate({ certificate, data }: Quotable): Words[] {
  if (!certificate) return [];
  const tried = words`${counted(certificate.thresholds, 'count')} ${certificate.thresholds === 1 ? 'was' : 'were'} tried, with Bonferroni’s allowance`;
  if (data.misreadApplied)
    return [
      words`Beside the tests stands an exact certificate, without fit or simulation: the number of shots at or beyond a count is held against the heaviest tail that independent kinks can have${sayMisread({ data })} (${SOURCES_BY_YEAR.hoeffding}, for each number of bonds that misreads toggle${data.geometry === 'ring-bonds' ? '; round a ring half the count is a sum of independent trials' : ''}), at the unfavourable end of limits for the mean (Bernstein’s inequality) that miss with a chance of at most one in a million, which is added to ${math('p')} (${SOURCES_BY_YEAR.bergerBoos}); ${tried}.`
    ];
  const interval = data.trials === null ? SOURCES_BY_YEAR.garwood : SOURCES_BY_YEAR.clopperPearson;
  return [
    words`Beside the tests stands an exact certificate, without fit or simulation: the number of shots at or beyond a count is held against the heaviest tail that independent trials can have (${SOURCES_BY_YEAR.hoeffding}), at the unfavourable end of an exact interval for the mean (${interval}) that misses with a chance of one in a million, which is added to ${math('p')} (${SOURCES_BY_YEAR.bergerBoos}); ${tried}.`
  ];
}
