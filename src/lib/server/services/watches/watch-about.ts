import { WATCHED_KINDS, type Watched } from '$lib/model/watches/watch-form';

/** What a watch is about, with the last event before each kind was chosen: nobody is told of the past. */
export type WatchAbout = Partial<Record<Watched, number>>;

/** Events of each kind, by their actions. A report is made when a diagnosis ends well. */
export const ACTIONS_OF: Record<Watched, string[]> = {
  'gate-fail': ['gate.fail'],
  remark: ['remark.add'],
  'job-end': ['report.make', 'job.fail']
};

export const ALL_WATCHED_ACTIONS = Object.values(ACTIONS_OF).flat();

export const readAbout = (text: string): WatchAbout => JSON.parse(text) as WatchAbout;

export const kindsOf = (about: WatchAbout): Watched[] =>
  WATCHED_KINDS.filter((kind) => about[kind] !== undefined);

export const kindOf = (action: string): Watched | undefined =>
  WATCHED_KINDS.find((kind) => ACTIONS_OF[kind].includes(action));
