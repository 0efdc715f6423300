import { oneTimeUnit } from '../../../model/one-time-unit';
import { refuseUnlike } from '../../../model/refuse-unlike';
import { inUnits } from '../../../stats/input/in-units';
import { toHistogram } from '../../../stats/input/to-histogram';
import type { SweepInput, SweepOptions } from '../../../stats/sweep/types';
import { BadInput, type CountData, type Interval, type Unit } from '../../../stats/types';
import type { ChosenDataset } from './chosen-datasets';

/**
 * Saved datasets as a sweep takes them: times in one unit, that of the first of them, and counts in the unit that all
 * state.
 *
 * @throws BadInput where a time is missing, units of time are mixed, datasets are unlike (refuseUnlike), counts are lumped,
 *   or odd counts are to be pairs
 */
export function inputsOfDatasets(
  chosen: ChosenDataset[],
  axis: SweepOptions['axis']
): { inputs: SweepInput[]; timeUnit: string; unit: Unit } {
  refuseUnlike(chosen);
  const quench = axis === 'quench-time';
  const stated = chosen.map((one) => ({
    label: one.name,
    time: quench ? one.quenchTime : one.holdTime,
    unit: quench ? one.quenchUnit : one.holdUnit
  }));
  const times = oneTimeUnit(stated, quench ? 'quench time' : 'hold time');
  if (!times.ok) throw new BadInput(times.reason);
  const [{ unit }] = chosen;
  const inputs = chosen.map(({ id, name, digest, verdict, dispersion, counts, kept, trials, misread }, i) => {
    const { histogram } = inUnits(toHistogram(JSON.parse(counts) as CountData), null, unit);
    if (histogram.lump || histogram.below)
      throw new BadInput(
        `“${name}” lumps counts: its cumulants are not known. Leave it out, or give every count.`
      );
    if (kept !== null)
      throw new BadInput(
        `Of “${name}” only the counts ${kept} were kept: its cumulants are those of a cut law. Leave it out, or give every count.`
      );
    const known = dispersion === null ? null : (JSON.parse(dispersion) as Interval);
    return {
      label: name,
      time: times.times[i],
      counts: histogram.counts,
      trials,
      misread,
      dataset: { id, digest, verdict, dispersion: known && known.value !== null ? known : null }
    };
  });
  return { inputs, timeUnit: times.unit, unit };
}
