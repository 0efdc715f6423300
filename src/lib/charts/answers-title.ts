import type { SweepReport } from '$lib/stats/sweep/types';
import { answersAlong } from './answers-along';
import type { Role } from './picture';

const SAID: Partial<Record<Role, string>> = {
  'observed-more': 'ruled out',
  'observed-unsure': 'undecided',
  observed: 'compatible'
};

/** How many of the datasets have which answer. */
export function answersTitle(report: Pick<SweepReport, 'points'>): string {
  const rows = answersAlong(report).map(({ role, points }) => ({
    words: SAID[role] ?? 'not diagnosed',
    number: points.length
  }));
  const all = report.points.length;
  if (rows.every(({ words }) => words === 'not diagnosed'))
    return `None of the ${all} datasets was diagnosed`;
  return `Independent trials, of ${all} datasets: ${rows.map(({ words, number }) => `${words} in ${number}`).join(', ')}`;
}
