import { conditionOfName } from '$lib/formats/conditions/condition-of-name';
import { recogniseConditions } from '$lib/formats/conditions/recognise-conditions';
import type { Dataset } from '$lib/formats/types';
import { oneTimeUnit } from '$lib/model/one-time-unit';
import { refuseUnlike } from '$lib/model/refuse-unlike';
import { inUnits } from '$lib/stats/input/in-units';
import { toHistogram } from '$lib/stats/input/to-histogram';
import { mixedConditions } from '$lib/stats/sweep/mixed-conditions';
import type { MixedCondition, SweepInput, SweepOptions } from '$lib/stats/sweep/types';
import { BadInput } from '$lib/stats/types';

/**
 * The datasets of a file as a sweep takes them: the time of each from the conditions beside its counts.
 *
 * @throws BadInput where a time is missing or below 0, units are mixed, datasets are unlike (refuseUnlike), counts are lumped, or odd counts are to be pairs
 */
export function sweepInputs(
  datasets: Dataset[],
  { axis, unit }: Pick<SweepOptions, 'axis' | 'unit'>
): { inputs: SweepInput[]; timeUnit: string; mixed: MixedCondition[] } {
  refuseNegative(datasets, axis);
  const read = datasets.map((dataset) => recogniseConditions(dataset).conditions);
  const stated = datasets.map((dataset, i) => {
    const conditions = read[i];
    return axis === 'quench-time'
      ? { label: dataset.name, time: conditions.quenchTime, unit: conditions.quenchUnit }
      : { label: dataset.name, time: conditions.holdTime, unit: conditions.holdUnit };
  });
  const times = oneTimeUnit(stated, axis === 'quench-time' ? 'quench time' : 'hold time');
  if (!times.ok) throw new BadInput(times.reason);
  refuseUnlike(datasets.map(({ name }, i) => ({ ...read[i], name, unit })));
  const inputs = datasets.map(({ name, data }, i) => {
    const { histogram } = inUnits(toHistogram(data), null, unit);
    if (histogram.lump || histogram.below)
      throw new BadInput(
        `“${name}” lumps counts: its cumulants are not known. Leave it out, or give every count.`
      );
    return { label: name, time: times.times[i], counts: histogram.counts };
  });
  return { inputs, timeUnit: times.unit, mixed: mixedConditions(read) };
}

/** A time below 0 is no time, and would be told as none stated. */
function refuseNegative(datasets: Dataset[], axis: SweepOptions['axis']): void {
  const [wanted, what] = axis === 'quench-time' ? ['quenchTime', 'quench time'] : ['holdTime', 'hold time'];
  for (const { name, conditions } of datasets)
    for (const [column, cell] of Object.entries(conditions))
      if (conditionOfName(column) === wanted && /^\s*[-\u2212]\s*[\d.,]/.test(cell))
        throw new BadInput(
          `“${name}” has a ${what} of ${cell.trim()}. A time is 0 or more, and above 0 on the logarithmic axis of a sweep.`
        );
}
