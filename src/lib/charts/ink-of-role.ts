import type { Ink, Role } from './picture';

export interface Look {
  stroke: Ink;
  fill: Ink;
  width: number;
  /** Dash lengths in picture units; empty for an unbroken line. */
  dash: number[];
}

const line = (stroke: Ink, width: number, dash: number[] = []): Look => ({
  stroke,
  fill: 'none',
  width,
  dash
});
const solid = (fill: Ink): Look => ({ stroke: 'none', fill, width: 0, dash: [] });

const LOOKS: Record<Role, Look> = {
  observed: solid('ink'),
  'observed-more': solid('oxide'),
  'observed-fewer': solid('verdigris'),
  'observed-unsure': { stroke: 'brass', fill: 'paper', width: 2, dash: [] },
  interval: line('ink', 1.25),
  'interval-more': line('oxide', 1.25),
  'interval-fewer': line('verdigris', 1.25),
  'interval-unsure': line('brass', 1.25),
  range: line('ink', 3),
  'range-more': line('oxide', 3),
  'range-fewer': line('verdigris', 3),
  unseen: line('faint', 1),
  fitted: line('ink', 1.75),
  // The fitted law where it is a point and not a line.
  law: { stroke: 'ink', fill: 'paper', width: 1.75, dash: [] },
  corner: line('faint', 1.5),
  limit: line('ink', 1.5, [7, 4]),
  gaussian: line('faint', 1),
  'mean-bound': line('faint', 1.25, [2, 3]),
  bound: line('ink', 1.25),
  hatch: line('faint', 1),
  horizon: line('ink', 1),
  smallest: line('ink', 1),
  shade: line('hair', 1),
  axis: line('ink', 1),
  grid: line('hair', 1),
  level: line('faint', 1, [1, 3])
};

/** How a role is drawn: one grammar of marks for every chart. */
export const inkOfRole = (role: Role): Look => LOOKS[role];
