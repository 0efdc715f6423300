import type { JobList, JobRow } from '$lib/model/team/jobs/job-row';

/** A list with what is newly known of one job, in its place; the same list when the job is not in it. */
export function patchList(list: JobList, job: JobRow): JobList {
  if (!list.rows.some(({ id }) => id === job.id)) return list;
  return { ...list, rows: list.rows.map((row) => (row.id === job.id ? job : row)) };
}

/** Statuses of datasets with what is newly known of one job, unless a newer job of its dataset is shown. */
export function patchStatuses(statuses: Record<string, JobRow>, job: JobRow): Record<string, JobRow> {
  const shown = statuses[job.dataset.id];
  if (shown && shown.id !== job.id && shown.createdAt >= job.createdAt) return statuses;
  return { ...statuses, [job.dataset.id]: job };
}
