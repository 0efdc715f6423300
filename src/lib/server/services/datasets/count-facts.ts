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
  batches: number | null;
}

/**
 * Canonical text, digest and summary of counts. The mean takes a lump for its first count.
 *
 * @throws BadInput for counts that cannot be diagnosed
 */
export function countFacts(data: CountData): CountFacts {
  const histogram = toHistogram(data);
  const { counts, lump } = histogram;
  const shots = counts.reduce((sum, row) => sum + row[1], lump?.shots ?? 0);
  const sum = counts.reduce((all, row) => all + row[0] * row[1], lump ? lump.from * lump.shots : 0);
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
    smallest: counts[0][0],
    largest: lump?.from ?? counts[counts.length - 1][0],
    open: lump !== null,
    batches: data.kind === 'shots' && data.batches ? new Set(data.batches).size : null
  };
}
