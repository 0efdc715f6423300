import type { FitData } from '../fit/fit-data';
import { sampleMoments } from '../fit/sample-moments';
import type { Pace } from '../resampling/pace';
import type { DiagnoseOptions, Diagnosis } from '../types';
import { explainStatement } from './explain-statement';
import { independentLaws, type Independent } from './independent-laws';
import { pairLimit } from './pair-limit';
import { rank } from './rank';
import { separate } from './separate';
import { separation, type FittedStory, type Separation } from './separation';
import { shotsToSeparate } from './shots-to-separate';
import { storiesOn } from './stories';
import type { Seen } from './story';
import { fitStory } from './fit-story';
import { storyModel } from './story-model';
import { tellStory, type Attempt, type Unranked } from './tell-story';
import type { ExplanationId, Explanations } from './types';

/** AIC differences under this do not tell two explanations apart (Burnham & Anderson 2002, section 2.6 (m)). */
const tieWithin = 2;

/** Counts in a law beyond which a list of stories would take over ten seconds. */
const widest = 10_000;
/** With more trials a story far off its best would spread over all of them: a fit at N = 1e9 did not end in minutes. */
const mostTrials = 100_000;

/**
 * What else the counts could be: every story fitted by likelihood, ranked by AIC beside independent trials.
 *
 * @param data the histogram in the unit tested; its `trials` are in that unit too
 * @param moments of the document, for the limit on correlations
 */
export async function explanationsOf(
  data: FitData,
  options: DiagnoseOptions,
  moments: Pick<Diagnosis['moments'], 'ceiling' | 'dispersion'>,
  independent: Independent,
  pace: Pace
): Promise<Explanations> {
  const { mean, variance } = sampleMoments(data);
  const { trials, lump, below } = data;
  const last = Math.max(lump?.from ?? 0, data.first + data.shots.length - 1);
  const seen: Seen = { mean, variance, last, empty: data.first === 0 ? data.shots[0] / data.total : 0 };
  const told: Unranked[] = independentLaws(data, independent);
  const fitted = new Map<ExplanationId, FittedStory>();
  const notRun: Explanations['notRun'] = [];
  const allEven = data.shots.every((shots, i) => shots === 0 || (data.first + i) % 2 === 0);
  const setting = {
    trials,
    unit: options.unit,
    geometry: options.geometry,
    last,
    lump: lump !== null,
    allEven
  };
  // Windows reach 52 standard deviations either way.
  const width = Math.min(trials ?? Infinity, 104 * Math.sqrt(Math.max(mean, variance)) + last - data.first);
  const flat = mean === 0 || mean === trials || variance === 0;
  const attempts: Attempt[] = [];
  const stories = storiesOn(options.geometry);
  for (const [index, story] of stories.entries()) {
    const refused = flat
      ? 'The counts have no spread to explain.'
      : width > widest || (trials ?? 0) > mostTrials
        ? 'Counts so widely spread, or with so many trials, would take too long.'
        : story.refuses(setting);
    const ranges = story.own(trials, seen);
    const over = (counts: FitData) => storyModel(story, counts, seen, ranges);
    const fit = refused ? null : fitStory(over(data), data);
    if (fit) attempts.push({ story, index, over, fit });
    else
      notRun.push({
        id: story.id,
        reason: refused ?? 'It gives practically no probability to a count that was seen.'
      });
    await pace.breathe((0.2 * (index + 1)) / stories.length);
  }
  const leading = Math.max(...attempts.map(({ fit }) => fit.logLikelihood));
  for (const [place, attempt] of attempts.entries()) {
    const part = {
      breathe: (share: number) => pace.breathe(0.2 + (0.8 * (place + share)) / attempts.length)
    };
    const one = await tellStory(attempt, data, seen, options, leading, part);
    told.push(one.told);
    fitted.set(attempt.story.id, one.fitted);
  }
  const ranked = rank(told);
  const apart = (a: ExplanationId, b: ExplanationId) => {
    const [first, second] = [fitted.get(a), fitted.get(b)];
    return first && second && !lump && !below ? separation(data, first, second) : null;
  };
  const tied = ranked.filter(({ behind }) => behind < tieWithin).map(({ id }) => id);
  return {
    ranked,
    tied,
    tieWithin,
    separate: tied.flatMap((a, i) =>
      tied.slice(i + 1).map((b) => {
        const pair = apart(a, b);
        const shots = pair && shotsToSeparate([pair]);
        return { between: [a, b] as [typeof a, typeof b], measurement: separate(a, b), shots };
      })
    ),
    shotsToLead: tied.length < 2 ? null : shotsToSeparate(rivals(apart, ranked)),
    notRun,
    pairs: lump || below ? null : pairLimit(trials, moments.ceiling, moments.dispersion),
    statement: explainStatement(ranked, tied, options.alpha)
  };
}

/** The first against every other story, but for those that give some of its counts no probability. */
const rivals = (
  apart: (a: ExplanationId, b: ExplanationId) => Separation | null,
  [first, ...others]: { id: ExplanationId }[]
): Separation[] => others.map(({ id }) => apart(first.id, id)).filter((one) => one !== null);
