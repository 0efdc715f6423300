import { z } from 'zod';

export const SHOWN = ['all', 'active', 'done', 'failed'] as const;

const shape = z.object({
  /** `active`: queued or running; `failed` includes cancelled ones. */
  show: z.enum(SHOWN).catch('all'),
  page: z.coerce.number().int().min(1).max(1e6).catch(1)
});

export type JobQuery = z.infer<typeof shape>;

/** What the list of jobs shows, from an address; what is not understood counts as not given. */
export function readJobQuery(search: URLSearchParams): JobQuery {
  return shape.parse({ show: search.get('show') ?? undefined, page: search.get('page') ?? undefined });
}

/** The query as the part of an address after `?`, only what differs from a fresh list. */
export function writeJobQuery({ show, page }: JobQuery): string {
  const search = new URLSearchParams();
  if (show !== 'all') search.set('show', show);
  if (page !== 1) search.set('page', String(page));
  return search.toString();
}
