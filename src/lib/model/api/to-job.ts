import type { JobRow } from '../team/jobs/job-row';
import type { ApiJob } from './shapes/job';
import { isoMoment } from './shapes/moment';

/** A job as the API tells it. */
export const toJob = ({ id, status, dataset, share, step, reason, report, by, ...at }: JobRow): ApiJob => ({
  id,
  status,
  dataset,
  share,
  step,
  reason,
  report,
  by,
  createdAt: isoMoment(at.createdAt),
  endedAt: at.endedAt === null ? null : isoMoment(at.endedAt)
});
