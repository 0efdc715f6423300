import { capital } from '../words/capital';
import { formatPercent } from '../words/format-number';
import { sayP } from '../words/say-p';
import { explanationNames } from './explanation-names';
import { rejected } from './rejected';
import type { Explanation, ExplanationId } from './types';

const joined = (ids: ExplanationId[]): string => {
  const names = ids.map((id) => explanationNames[id]);
  return names.length < 2 ? names.join('') : `${names.slice(0, -1).join(', ')} and ${names.at(-1)}`;
};

/**
 * The finding in a sentence or three: which explanation leads, which cannot be told from it, and whether it fits at all.
 *
 * @param ranked best first
 * @param alpha level at which the leading one is said not to fit; see rejected
 */
export function explainStatement(ranked: Explanation[], tied: ExplanationId[], alpha: number): string {
  const [first] = ranked;
  if (!first) return 'No explanation could be fitted to these counts.';
  const independent = (id: ExplanationId) => id === 'equal-trials' || id === 'best-independent';
  const stories = ranked.filter(({ id }) => !independent(id));
  if (stories.length === 0) return 'No story could be fitted to these counts; only independent trials were.';
  if (tied.some(independent)) {
    const worse = independent(first.id)
      ? 'None of the stories describes the counts better than independent trials do'
      : `The first story, ${explanationNames[first.id]}, describes the counts no better than independent trials could`;
    return `${worse}: if these are ruled out, it is by something that the list does not know, such as the order of the shots.`;
  }
  const others = tied.filter((id) => id !== first.id);
  const weight = first.weight > 0.999 ? 'practically all' : formatPercent(first.weight);
  const lead =
    others.length === 0
      ? `Of the stories told here the counts are described best by ${explanationNames[first.id]}, with ${weight} of the weight.`
      : `${capital(joined(tied))} describe the counts about equally well: these shots cannot tell them apart.`;
  const { goodness } = first;
  if (!goodness) return lead;
  const far = `counts so far from it ${sayP(goodness.p, goodness.smallestP, goodness.resamples)} if it were true.`;
  const end = 'Something else is at work, or more than one of them.';
  if (rejected(first, alpha))
    return others.length === 0
      ? `Of the stories told here ${explanationNames[first.id]} comes nearest to the counts, but it does not fit: ${far} Its weight, ${weight} of the list’s, sets it against the others alone. ${end}`
      : `${lead} But the first of them does not fit either: ${far} ${end}`;
  return `${lead} The fit of ${others.length > 0 ? 'the first of them' : 'it'} is not rejected at the level of ${formatPercent(alpha, 2)}: ${far} That the counts fit a story does not say that it happened.`;
}
