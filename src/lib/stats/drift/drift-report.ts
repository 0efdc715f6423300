import type { NullLaw } from '../nulls/null-law';
import type { Pace } from '../resampling/pace';
import { stream } from '../resampling/streams';
import type { CountData, DiagnoseOptions, Diagnosis } from '../types';
import { batchParts } from './batch-parts';
import { changePoint } from './change-point';
import { driftStatement } from './drift-statement';
import { runningMean } from './running-mean';
import { splitExcess } from './split-excess';
import { equalSquaresLaw, readSquaresLaw } from './squares-law';
import type { BatchSplit, DriftPart } from './types';
import { withinBatches } from './within-batches';
import { withinOrder } from './within-order';

/** Points of the chart of means: more would crowd a phone. */
const points = 40;
/** Permutations for the change of the mean: its place matters more than a far p, and each scans all shots. */
const permutations = 499;

/**
 * What the order of the shots and their batches say of the excess; undefined for histograms, which keep neither.
 * Adds to a diagnosis and decides nothing in it.
 *
 * @param trials in the unit tested, as are `moments`; the shots are as given
 */
export async function driftReport(
  data: CountData,
  trials: number | null,
  moments: Pick<Diagnosis['moments'], 'mean' | 'variance' | 'ceiling'>,
  tested: Pick<NullLaw, 'ceiling' | 'mostDispersed'>,
  options: DiagnoseOptions,
  excessShown: boolean,
  pace: Pace
): Promise<DriftPart | undefined> {
  if (data.kind === 'histogram') return undefined;
  const shots =
    options.unit === 'pair' ? Float64Array.from(data.shots, (n) => n / 2) : Float64Array.from(data.shots);
  const found = await changePoint(
    shots,
    {
      resamples: Math.min(options.resamples, permutations),
      seed: options.seed,
      stream: stream('change of the mean', 0)
    },
    pace
  );
  const split = data.batches
    ? splitOf(shots, data.batches, trials, moments, tested, options)
    : 'No batches were given, so drift between them cannot be told from an excess within them.';
  return {
    means: runningMean(shots, Math.max(5, Math.ceil(shots.length / points))),
    change: found && {
      shot: found.at + 1,
      before: found.before,
      after: found.after,
      p: found.p,
      smallestP: found.smallestP,
      source: found.source,
      resamples: found.resamples
    },
    split: typeof split === 'string' ? null : split,
    statement: typeof split === 'string' ? split : driftStatement(split, excessShown)
  };
}

/** The split, or why there is none. */
function splitOf(
  shots: Float64Array,
  names: string[],
  trials: number | null,
  moments: Pick<Diagnosis['moments'], 'mean' | 'variance' | 'ceiling'>,
  { ceiling, mostDispersed }: Pick<NullLaw, 'ceiling' | 'mostDispersed'>,
  options: DiagnoseOptions
): BatchSplit | string {
  // Few shots so cut scatter their mean over a ceiling that bends, by 23 % of it for two shots of Bin(20, 0.1) cut at 4.
  if (options.kept)
    return 'The excess was not split by batch, since a cut was declared: the ceiling of counts so cut bends with the mean, and with few shots a batch it would be off by up to a quarter. Diagnose the batches one by one instead.';
  if (new Set(names).size === 1)
    return 'All shots belong to one batch, so there is no drift between batches to tell.';
  const parts = batchParts(shots, names);
  if (parts === null)
    return 'Every batch has one shot only, so nothing lies within a batch: drift between batches cannot be told from an excess within them. Give batches of at least two shots, better of a hundred.';
  const variance = moments.variance.value;
  if (!variance || !(moments.ceiling > 0))
    return 'The counts have no spread to be split between batches and within them.';
  const mean = moments.mean.value!;
  const slope =
    ceiling === null
      ? 1 - (trials === null ? 0 : (2 * mean) / trials)
      : (mostDispersed.ceiling(mean * 1.001) - mostDispersed.ceiling(mean * 0.999)) / (mean * 0.002);
  const law = ceiling === null ? equalSquaresLaw(trials) : readSquaresLaw(mostDispersed, slope);
  const found = withinBatches(parts, law, slope, options);
  return splitExcess(parts, found, withinOrder(shots, names, found), variance - moments.ceiling, options);
}
