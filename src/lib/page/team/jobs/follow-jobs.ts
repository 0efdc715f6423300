import type { JobList, JobRow } from '$lib/model/team/jobs/job-row';
import type { QueryClient } from '@tanstack/svelte-query';
import { patchList, patchStatuses } from './patch-job';

interface Followed {
  followers: number;
  stop: () => void;
}

/** One stream a team and a page, however many parts of the page follow: a browser opens six connections in all. */
const followed = new Map<string, Followed>();

/** Longest wait before a stream that was refused is asked for again; it doubles from the first one up. */
const [FIRST_WAIT, LAST_WAIT] = [2_000, 60_000];
/** Lists are not fetched again more often than this while many jobs change. */
const BETWEEN_LISTS = 1_000;

export const jobKeys = {
  all: (slug: string) => ['jobs', slug] as const,
  list: (slug: string, search: string) => ['jobs', slug, 'list', search] as const,
  statuses: (slug: string, datasetIds: string) => ['jobs', slug, 'statuses', datasetIds] as const
};

/**
 * Keeps the cached jobs of a team up to date by server-sent events, in the browser.
 *
 * @returns stops following
 */
export function followJobs(client: QueryClient, slug: string): () => void {
  const known = followed.get(slug) ?? { followers: 0, stop: listen(client, slug) };
  known.followers++;
  followed.set(slug, known);
  let following = true;
  return () => {
    if (!following) return;
    following = false;
    if (--known.followers > 0) return;
    followed.delete(slug);
    known.stop();
  };
}

function listen(client: QueryClient, slug: string): () => void {
  let source: EventSource | null = null;
  let again: ReturnType<typeof setTimeout> | undefined;
  let lists: ReturnType<typeof setTimeout> | undefined;
  let wait = FIRST_WAIT;

  let fetched = 0;
  const refetch = () => {
    const late = Math.max(0, fetched + BETWEEN_LISTS - Date.now());
    lists ??= setTimeout(() => {
      lists = undefined;
      fetched = Date.now();
      void client.invalidateQueries({ queryKey: jobKeys.all(slug) });
    }, late);
  };
  const take = ({ data }: MessageEvent<string>) => {
    const job = JSON.parse(data) as JobRow;
    client.setQueriesData<JobList>(
      { queryKey: ['jobs', slug, 'list'] },
      (list) => list && patchList(list, job)
    );
    client.setQueriesData<Record<string, JobRow>>(
      {
        queryKey: ['jobs', slug, 'statuses'],
        predicate: ({ queryKey }) => String(queryKey[3]).split(',').includes(job.dataset.id)
      },
      (statuses) => statuses && patchStatuses(statuses, job)
    );
  };
  const close = () => {
    source?.close();
    source = null;
    clearTimeout(again);
  };
  const open = () => {
    close();
    if (document.hidden) return;
    source = new EventSource(`/team/${slug}/jobs/stream`);
    source.addEventListener('open', () => (wait = FIRST_WAIT));
    // The first one comes at once, so what was missed during a break is fetched.
    source.addEventListener('state', refetch);
    source.addEventListener('job', take);
    source.addEventListener('error', () => {
      // A break is mended by the browser itself; a refusal (signed out, server starting) is not.
      if (source?.readyState !== EventSource.CLOSED) return;
      again = setTimeout(open, wait);
      wait = Math.min(2 * wait, LAST_WAIT);
    });
  };
  // A page that nobody sees holds no connection.
  document.addEventListener('visibilitychange', open);
  open();
  return () => {
    document.removeEventListener('visibilitychange', open);
    close();
    clearTimeout(lists);
  };
}
