import type { Dataset } from '../../../formats/types';

/**
 * What the datasets of one file are called at first: by the columns in which they differ, so that a date that is the
 * same on all of them does not make every name long. The only dataset of a file keeps its own name.
 */
export function namesOfParts(datasets: Dataset[]): string[] {
  const [first] = datasets;
  const differ = new Set(
    datasets.flatMap(({ conditions }) =>
      Object.keys(conditions).filter((column) => conditions[column] !== first.conditions[column])
    )
  );
  return datasets.map(({ name, conditions }) => {
    const parts = Object.entries(conditions).filter(([column]) => differ.has(column));
    return parts.map(([column, value]) => `${column} ${value}`).join(', ') || name;
  });
}
