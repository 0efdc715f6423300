import { digest } from '../../../stats/input/digest';
import { toHistogram } from '../../../stats/input/to-histogram';
import type { CountData } from '../../../stats/types';

/** What the table of datasets says about counts. */
export interface CountFacts {
  kind: 'histogram' | 'shots';
  /** CountData as JSON: a histogram in ascending order without empty rows, or the shots in their order. */
  text: string;
  digest: string;
  shots: number;
  mean: number;
  smallest: number;
  largest: number;
  open: boolean;
  opening: boolean;
  batches: number | null;
}

/**
 * Canonical text, digest and summary of counts. The mean takes a lump for the count nearest to the others.
 *
 * @throws BadInput for counts that cannot be diagnosed
 */
export function countFacts(data: CountData): CountFacts {
  const histogram = toHistogram(data);
  const { counts, lump, below = null } = histogram;
  const rows = [
    ...(below ? [[below.to, below.shots]] : []),
    ...counts,
    ...(lump ? [[lump.from, lump.shots]] : [])
  ];
  const shots = rows.reduce((sum, row) => sum + row[1], 0);
  const sum = rows.reduce((all, row) => all + row[0] * row[1], 0);
  const canonical: CountData =
    data.kind === 'shots'
      ? { kind: 'shots', shots: Array.from(data.shots), batches: data.batches }
      : histogram;
  return {
    kind: data.kind,
    text: JSON.stringify(canonical),
    digest: digest(histogram),
    shots,
    mean: sum / shots,
    smallest: rows[0][0],
    largest: rows[rows.length - 1][0],
    open: lump !== null,
    opening: below !== null,
    batches: data.kind === 'shots' && data.batches ? new Set(data.batches).size : null
  };
}
