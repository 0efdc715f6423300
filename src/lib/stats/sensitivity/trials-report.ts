import { criticalTrials } from '../bounds/critical-trials';
import type { Diagnosis, Interval } from '../types';
import { formatCount } from '../words/format-number';
import type { TrialsPart, TrialsPoint } from './types';

/** Numbers of trials between the largest count and 100 times it: enough for a smooth line. */
const steps = 20;
/** Beyond this many times the largest count a ceiling hardly differs from that of unknown N. */
const reach = 100;

/**
 * Dispersion as N runs from the largest count to unknown, in the unit tested: the variance and its limits over the
 * ceiling μ(1 − μ/N) of each N, exact in the variance; that the mean is uncertain too moves ceiling and variance
 * together and is left out, as little beside the variance. Nothing is refitted and no test repeated.
 *
 * @param largest count seen, ≥ 1
 * @param trials N as stated, or null
 * @returns undefined where there is no spread
 */
export function trialsReport(
  moments: Pick<Diagnosis['moments'], 'mean' | 'variance'>,
  largest: number,
  trials: number | null,
  tolerance: number
): TrialsPart | undefined {
  const mean = moments.mean.value!;
  const { value, low, high } = moments.variance;
  if (value === null || !(value > 0) || !(mean > 0 && mean < largest)) return undefined;
  const critical = criticalTrials(mean, value);
  const numbers = new Set<number>([largest]);
  for (let k = 1; k <= steps; k++) numbers.add(Math.round(largest * Math.exp((k / steps) * Math.log(reach))));
  if (trials !== null) numbers.add(trials);
  const over = critical === null ? null : Math.ceil(critical);
  if (over !== null && over >= largest && over <= 1e9) numbers.add(over);
  const at = (n: number | null): TrialsPoint => {
    const ceiling = mean * (1 - (n === null ? 0 : mean / n));
    const part = (x: number | null) => (x === null ? null : x / ceiling);
    const dispersion: Interval = { value: value / ceiling, low: part(low), high: part(high) };
    const standing =
      dispersion.low !== null && dispersion.low > 1
        ? 'over'
        : dispersion.high !== null && dispersion.high < 1 + tolerance
          ? 'within'
          : 'unsure';
    return { trials: n, ceiling, dispersion, standing };
  };
  const points = [...[...numbers].sort((a, b) => a - b).map(at), at(null)];
  return { points, critical, statement: words(points, critical, largest) };
}

function words(points: TrialsPoint[], critical: number | null, largest: number): string {
  const how = 'By the interval of the variance alone, nothing refitted:';
  const first = points[0].standing;
  const turn = points.find(({ standing }) => standing !== first);
  const said = {
    over: 'over its ceiling',
    within: 'not over it by an excess that matters',
    unsure: 'undecided'
  };
  const course =
    turn === undefined
      ? `${how} the variance is ${said[first]} for every N from the largest count, ${formatCount(largest)}, to unknown.`
      : `${how} from N = ${formatCount(largest)}, the largest count, the variance is ${said[first]}; from N = ${turn.trials === null ? 'unknown' : `about ${formatCount(turn.trials)}`} on, ${said[turn.standing]}; with N unknown, ${said[points[points.length - 1].standing]}.`;
  const rescue =
    critical === null
      ? 'No number of trials brings the ceiling up to it.'
      : critical <= largest
        ? 'No N that the counts allow brings the ceiling below it.'
        : `The ceiling equals it at N = ${formatCount(Math.ceil(critical))}, rounded up.`;
  return `${course} ${rescue}`;
}
