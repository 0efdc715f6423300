import type { Effect } from '$lib/stats/planning/effect';
import type { LuckyShot } from '$lib/stats/planning/lucky-shot';
import type { ShotsToSee } from '$lib/stats/planning/shots-to-see';
import type { SimulatedPower } from '$lib/stats/planning/simulate-power';
import type { OddsRequest, PlanRequest } from './read-plan';

/** What the planner found; a part that was not asked for is undefined. */
export interface Planned {
  needed?: ShotsToSee | null;
  /** Power by shots, to twice and a half of those needed. */
  curve?: [shots: number, power: number][];
  /** Size that the given shots see; null when they see none. */
  smallest?: number | null;
}

/** Odds of a lucky shot, and the law they are taken under. */
export interface Odds {
  lucky: LuckyShot;
  mean: number;
  /** Best law of the counts, or equal trials of the mean. */
  fitted: boolean;
  shots: number | null;
}

/** What the page asks of its worker, and what comes back for each. */
export interface Tasks {
  plan: { request: PlanRequest; result: Planned };
  simulate: { request: { effect: Effect; shots: number; alpha: number }; result: SimulatedPower | null };
  odds: { request: OddsRequest; result: { ok: true; odds: Odds } | { ok: false; problem: string } };
}

export type TaskRequest = {
  [Kind in keyof Tasks]: { kind: Kind; asked: Tasks[Kind]['request'] };
}[keyof Tasks];

export type TaskAnswer =
  | { kind: 'progress'; share: number }
  | { kind: 'done'; result: Tasks[keyof Tasks]['result'] }
  | { kind: 'failed'; message: string };
