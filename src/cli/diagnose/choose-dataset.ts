import type { Dataset } from '$lib/formats/types';
import { Refusal } from '../shared/exit-codes';
import { inputName } from '../shared/input-name';

const plain = (name: string) => name.trim().toLowerCase();

/**
 * The dataset asked for, or the only one.
 *
 * @throws Refusal that lists the names when there are several and none is asked for, or no such one.
 */
export function chooseDataset(file: string, datasets: Dataset[], wanted: string | null): Dataset {
  const names = datasets.map(({ name }) => `  --dataset ${JSON.stringify(name)}`);
  if (wanted === null) {
    if (datasets.length === 1) return datasets[0];
    throw new Refusal([
      `${inputName(file)}: The file holds ${datasets.length} datasets. Choose one:`,
      ...names
    ]);
  }
  const found = datasets.find(({ name }) => plain(name) === plain(wanted));
  if (found) return found;
  throw new Refusal([
    `${inputName(file)}: There is no dataset "${wanted}". There ${names.length === 1 ? 'is' : 'are'}:`,
    ...names
  ]);
}
