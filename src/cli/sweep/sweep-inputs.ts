import { recogniseConditions } from '$lib/formats/conditions/recognise-conditions';
import type { Dataset } from '$lib/formats/types';
import { oneTimeUnit } from '$lib/model/one-time-unit';
import { inUnits } from '$lib/stats/input/in-units';
import { toHistogram } from '$lib/stats/input/to-histogram';
import type { SweepInput, SweepOptions } from '$lib/stats/sweep/types';
import { BadInput } from '$lib/stats/types';

/**
 * The datasets of a file as a sweep takes them: the time of each from the conditions beside its counts.
 *
 * @throws BadInput where a time is missing, units are mixed, counts are lumped, or odd counts are to be pairs
 */
export function sweepInputs(
  datasets: Dataset[],
  { axis, unit }: Pick<SweepOptions, 'axis' | 'unit'>
): { inputs: SweepInput[]; timeUnit: string } {
  const stated = datasets.map((dataset) => {
    const { conditions } = recogniseConditions(dataset);
    return axis === 'quench-time'
      ? { label: dataset.name, time: conditions.quenchTime, unit: conditions.quenchUnit }
      : { label: dataset.name, time: conditions.holdTime, unit: conditions.holdUnit };
  });
  const times = oneTimeUnit(stated, axis === 'quench-time' ? 'quench time' : 'hold time');
  if (!times.ok) throw new BadInput(times.reason);
  const inputs = datasets.map(({ name, data }, i) => {
    const { histogram } = inUnits(toHistogram(data), null, unit);
    if (histogram.lump || histogram.below)
      throw new BadInput(
        `“${name}” lumps counts: its cumulants are not known. Leave it out, or give every count.`
      );
    return { label: name, time: times.times[i], counts: histogram.counts };
  });
  return { inputs, timeUnit: times.unit };
}
