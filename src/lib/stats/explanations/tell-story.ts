import type { FitData } from '../fit/fit-data';
import { saturated } from '../resampling/divergence';
import type { Pace } from '../resampling/pace';
import { stream } from '../resampling/streams';
import { formatNumber, formatPercent } from '../words/format-number';
import { curvatureInterval } from './curvature-interval';
import { goodness } from './goodness';
import { profileInterval } from './profile-interval';
import type { Seen, Story } from './story';
import type { StoryModel } from './story-model';
import type { ScoreFit } from './score-fit';
import type { FittedStory } from './separation';
import type { Explanation } from './types';

/** A story that was fitted; its place in the registry gives it random streams of its own. */
export interface Attempt {
  story: Story;
  index: number;
  /** The story laid over other counts. */
  over: (data: FitData) => StoryModel;
  fit: ScoreFit;
}

/** An explanation before it is ranked among the others. */
export type Unranked = Omit<Explanation, 'behind' | 'weight'>;

/** Histograms drawn for the goodness of fit of one story. */
const draws = 199;

/** Nats behind the best story beyond which goodness of fit is not asked and the interval is the curvature's. */
const hopeless = 50;

/** Resamples of one story are fewer than this, so that the streams of stories keep apart. */
const room = 4096;

/**
 * Fits one story and says how well it fits: parameters, profile interval, AIC, goodness by resampling, words.
 *
 * @param attempt the story where it fits best
 * @param leading greatest log-likelihood among the stories
 */
export async function tellStory(
  { story, index, over, fit }: Attempt,
  data: FitData,
  seen: Seen,
  options: { resamples: number; seed: number },
  leading: number,
  pace: Pace
): Promise<{ told: Unranked; fitted: FittedStory }> {
  const { trials } = data;
  const ranges = story.own(trials, seen);
  const model = over(data);
  await pace.breathe(0.1);
  const out = leading - fit.logLikelihood > hopeless;
  const interval = out ? curvatureInterval(model, fit) : profileInterval(model, data, fit);
  await pace.breathe(0.2);
  // A story so far behind is out whatever its own fit; to refit its resamples would take most of the time.
  const fits = out
    ? null
    : await goodness(
        data,
        fit,
        model.whole(fit.x),
        over,
        {
          most: Math.min(draws, options.resamples),
          seed: options.seed,
          streamOf: (b) => stream('explanations', index * room + b)
        },
        { breathe: (share) => pace.breathe(0.2 + 0.8 * share) }
      );
  const own = fit.x.slice(1);
  const base = model.base(fit.x);
  const say = (write: (value: number) => string) =>
    `${write(own[0])} (95\u202f%: ${write(interval.low)} to ${write(interval.high)})`;
  const told: Unranked = {
    id: story.id,
    logLikelihood: fit.logLikelihood,
    parameters: fit.x.length,
    aic: 2 * fit.x.length - 2 * fit.logLikelihood,
    base,
    parameter: { symbol: ranges[0].symbol, value: own[0], ...interval },
    second: own.length > 1 ? { symbol: ranges[1].symbol, value: own[1] } : null,
    gSquared: Math.max(0, 2 * (saturated(data) - fit.logLikelihood)),
    goodness: fits,
    meaning: story.meaning({
      trials,
      base,
      own,
      span: say((value) => formatNumber(value, 2)),
      percent: say((value) => formatPercent(value, 2))
    })
  };
  return { told, fitted: { model, fit, over } };
}
