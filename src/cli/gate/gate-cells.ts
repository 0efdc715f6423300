import { recogniseConditions } from '$lib/formats/conditions/recognise-conditions';
import type { Dataset } from '$lib/formats/types';
import { readKept } from '$lib/model/read-kept';
import { sayGroup } from '$lib/model/team/devices/cell';
import { toHistogram } from '$lib/stats/input/to-histogram';
import { BadInput } from '$lib/stats/types';
import type { VersionCell } from '$lib/stats/versions/types';

/**
 * The datasets of one device as cells of its gate, each with the version, group and number of trials that stand beside its
 * counts.
 *
 * @throws BadInput where no version stands there, several devices do, or a version asked for is not there
 */
export function gateCells(
  datasets: Dataset[],
  asked: { device: string | null; trials: number | null; versions: string[] }
): VersionCell[] {
  const stated = datasets.map((dataset) => ({
    dataset,
    conditions: recogniseConditions(dataset).conditions
  }));
  const devices = [...new Set(stated.map(({ conditions }) => conditions.device ?? 'no device named'))];
  if (asked.device !== null && !devices.includes(asked.device))
    throw new BadInput(`There is no device ${asked.device}; there are: ${devices.join(', ')}.`);
  if (asked.device === null && devices.length > 1)
    throw new BadInput(`There are several devices: ${devices.join(', ')}. Choose one by --device.`);
  const cells = stated
    .filter(({ conditions }) => asked.device === null || conditions.device === asked.device)
    .map(({ dataset, conditions }): VersionCell => {
      if (conditions.firmware === null)
        throw new BadInput(`“${dataset.name}” states no firmware version: put it in a column “firmware”.`);
      return {
        group: sayGroup(conditions.group),
        version: conditions.firmware,
        label: dataset.name,
        histogram: toHistogram(dataset.data),
        trials: conditions.trials ?? asked.trials,
        unit: conditions.unit,
        geometry: conditions.geometry,
        misread: conditions.misread,
        kept: conditions.kept === null ? null : readKept(conditions.kept)
      };
    });
  const there = [...new Set(cells.map(({ version }) => version))];
  for (const version of asked.versions)
    if (!there.includes(version))
      throw new BadInput(`There is no version ${version}; there are: ${there.join(', ')}.`);
  return cells;
}
