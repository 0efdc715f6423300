import { VERDICTS } from '$lib/model/labels';
import type { SweepReport, SweptPoint } from '$lib/stats/sweep/types';
import type { Verdict } from '$lib/stats/types';
import type { Role } from './picture';
import type { Shape } from './point-path';

export interface AnswerRow {
  words: string;
  role: Role;
  shape: Shape;
  size: number;
  points: SweptPoint[];
}

const LOOKS: [Verdict, Role, Shape, number][] = [
  ['ruled-out', 'observed-more', 'up', 10],
  ['undecided', 'observed-unsure', 'diamond', 10],
  ['compatible', 'observed', 'dot', 7]
];

/** The datasets of a sweep by their answers, a row for each answer that occurs, and one for those without. */
export function answersAlong({ points }: Pick<SweepReport, 'points'>): AnswerRow[] {
  const rows: AnswerRow[] = LOOKS.map(([verdict, role, shape, size]) => ({
    words: VERDICTS[verdict],
    role,
    shape,
    size,
    points: points.filter(({ dataset }) => dataset?.verdict === verdict)
  }));
  rows.push({
    words: 'not diagnosed',
    role: 'law',
    shape: 'dot',
    size: 7,
    points: points.filter(({ dataset }) => !dataset?.verdict)
  });
  return rows.filter((row) => row.points.length > 0);
}
