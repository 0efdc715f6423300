import type { FitData } from '../fit/fit-data';
import { saturated } from '../resampling/divergence';
import type { Pace } from '../resampling/pace';
import { stream } from '../resampling/streams';
import { formatNumber, formatPercent } from '../words/format-number';
import { fitStory } from './fit-story';
import { goodness } from './goodness';
import { profileInterval } from './profile-interval';
import type { Seen, Story } from './story';
import { storyModel } from './story-model';
import type { FittedStory } from './shots-to-separate';
import type { Explanation } from './types';

/** An explanation before it is ranked among the others. */
export type Unranked = Omit<Explanation, 'behind' | 'weight'>;

/** Histograms drawn for the goodness of fit of one story. */
const draws = 199;

/** Resamples of one story are fewer than this, so that the streams of stories keep apart. */
const room = 4096;

/**
 * Fits one story and says how well it fits: parameters, profile interval, AIC, goodness by resampling, words.
 *
 * @param index place of the story in the registry; its random streams follow from it
 * @returns null when the story gives some count no probability, wherever its search starts
 */
export async function tellStory(
  story: Story,
  index: number,
  data: FitData,
  seen: Seen,
  options: { resamples: number; seed: number },
  pace: Pace
): Promise<{ told: Unranked; fitted: FittedStory } | null> {
  const { trials } = data;
  const ranges = story.own(trials, seen);
  const over = (counts: FitData) => storyModel(story, counts, seen, ranges);
  const model = over(data);
  const fit = fitStory(model, data);
  if (!fit) return null;
  await pace.breathe(0.1);
  const interval = profileInterval(model, data, fit);
  await pace.breathe(0.2);
  const fits = await goodness(
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
