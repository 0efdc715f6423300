import { VERDICTS } from '../labels';
import { compareFlags } from './compare-flags';
import { compareLines } from './compare-lines';
import { compareOptions } from './compare-options';
import { compareTests } from './compare-tests';
import type { Comparable, Comparison } from './compared';
import { sayChanges } from './say-changes';

/**
 * Two results side by side: answer, options, engine, data, tests, moments, fit and flags, each line with both values
 * and whether they differ in any digit. Nothing is computed anew: every value stands in one of the documents.
 */
export function compareResults(first: Comparable, second: Comparable): Comparison {
  const [a, b] = [first.document, second.document];
  const parts = [
    compareLines('answer', 'Answer', [
      ['Answer', VERDICTS[a.answer.verdict], VERDICTS[b.answer.verdict]],
      ['Smallest excess that would show', a.answer.smallestExcess, b.answer.smallestExcess],
      ['Shots that would decide', a.answer.shotsToDecide, b.answer.shotsToDecide]
    ]),
    compareOptions(first.options, second.options),
    compareLines('engine', 'Engine', [
      ['Version', a.engine.version, b.engine.version],
      ['Document', a.format, b.format]
    ]),
    compareLines('data', 'Counts', [
      ['Digest', a.data.digest, b.data.digest],
      ['Shots', a.data.shots, b.data.shots],
      ['Order of the shots', a.data.ordered ? 'known' : 'not known', b.data.ordered ? 'known' : 'not known'],
      ['Batches', a.data.batches, b.data.batches]
    ]),
    compareTests(a, b),
    compareLines('moments', 'Moments', [
      ['κ₁, mean', a.moments.mean, b.moments.mean],
      ['κ₂, variance', a.moments.variance, b.moments.variance],
      ['κ₃', a.moments.third, b.moments.third],
      ['κ₄', a.moments.fourth, b.moments.fourth],
      ['κ₂/κ₁, Fano factor', a.moments.fano, b.moments.fano],
      ['Ceiling of the variance', a.moments.ceiling, b.moments.ceiling],
      ['Variance over ceiling', a.moments.dispersion, b.moments.dispersion],
      ['Least N under the ceiling', a.moments.criticalTrials, b.moments.criticalTrials]
    ]),
    compareLines('fit', 'Best law', [
      ['Nats a shot from the counts', a.fit.divergence, b.fit.divergence],
      ['The same, chance taken off', a.fit.divergenceInterval, b.fit.divergenceInterval],
      ['Floor of any law', a.fit.floor, b.fit.floor],
      ['Shots to notice the distance', a.fit.shotsToNotice, b.fit.shotsToNotice],
      ['Distinct probabilities', a.fit.levels.length, b.fit.levels.length],
      ['Log-likelihood', a.fit.logLikelihood, b.fit.logLikelihood]
    ]),
    compareFlags(a, b)
  ];
  return {
    parts,
    changes: parts.reduce((sum, part) => sum + part.changes, 0),
    summary: sayChanges(first, second, parts)
  };
}
