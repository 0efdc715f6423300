import { z } from 'zod';

/** What people may hear of by mail, in words that end "Tell me when …". */
export const WATCHED = {
  'gate-fail': 'a gate is failed',
  remark: 'somebody remarks on a report',
  'job-end': 'a diagnosis ends'
} as const;
export type Watched = keyof typeof WATCHED;
export const WATCHED_KINDS = Object.keys(WATCHED) as [Watched, ...Watched[]];

export const RHYTHMS = ['at-once', 'daily'] as const;
export type Rhythm = (typeof RHYTHMS)[number];

/** What somebody wants to hear of one team; nothing chosen: no mail. */
export const watchFormSchema = z.object({
  about: z.array(z.enum(WATCHED_KINDS)).default([]),
  rhythm: z.enum(RHYTHMS).default('at-once')
});
export type WatchForm = z.output<typeof watchFormSchema>;

/** A team of somebody's, and what they hear of it. */
export interface MyWatch {
  slug: string;
  team: string;
  about: Watched[];
  rhythm: Rhythm;
}
