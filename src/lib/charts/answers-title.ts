import type { SweepReport } from '$lib/stats/sweep/types';
import { answersAlong } from './answers-along';

/** How many of the datasets have which answer. */
export function answersTitle(report: Pick<SweepReport, 'points'>): string {
  const rows = answersAlong(report);
  const all = report.points.length;
  if (rows.length === 1) return `All ${all} datasets: ${lower(rows[0].words)}`;
  return `Of ${all} datasets ${rows.map(({ words, points }) => `${points.length} ${lower(words)}`).join(', ')}`;
}

const lower = (words: string): string => words[0].toLowerCase() + words.slice(1);
