import type { Diagnosis } from '$lib/stats/types';
import { formatCount, formatNumber } from '../format-number';
import { TESTS } from '../labels';
import { sayHowOften, sayP } from '../say-p';
import { wrap } from './wrap';

/** The tests in words, the exact certificate, and the tests that did not run with their reasons. */
export function sayTests(diagnosis: Diagnosis): string {
  const { tests, notRun, tails, data } = diagnosis;
  const lines = ['Tests: if defects formed independently, so extreme a result …'];
  for (const test of tests) {
    const adjusted = `${formatNumber(test.pAdjusted, 2)} after Holm`;
    lines.push(
      wrap(`${TESTS[test.id]}: ${sayP(test.p, test.smallestP, test.resamples)}; ${adjusted}.`, '  – ')
    );
  }
  const { certificate } = tails;
  if (certificate) {
    const side = certificate.side === 'high' ? 'more' : 'fewer';
    lines.push(
      wrap(
        `exact certificate, without fit or simulation: ${formatCount(certificate.shots)} of ${formatCount(data.shots)} shots had ${formatCount(certificate.count)} or ${side}, where independent trials give at most ${formatNumber(certificate.bound, 2)} a shot; with the ${formatCount(certificate.thresholds)} counts tried allowed for, it ${sayHowOften(certificate.p, certificate.p)} (p ≤ ${formatNumber(certificate.p, 2)}, an upper bound).`,
        '  – '
      )
    );
  }
  for (const { id, reason } of notRun) lines.push(wrap(`${TESTS[id]}, not run: ${reason}`, '  – '));
  return lines.join('\n');
}
