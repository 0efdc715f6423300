import type { JobRow } from '$lib/model/team/jobs/job-row';
import { timeLeft } from '../../time-left';

export const STATUS_WORDS: Record<JobRow['status'], string> = {
  queued: 'waits for its turn',
  running: 'is running',
  done: 'is done',
  failed: 'failed',
  cancelled: 'was cancelled'
};

const STEPS: Record<NonNullable<JobRow['step']>, string> = {
  fit: 'fitting the best law',
  floor: 'looking for a law that no fit can beat',
  resampling: 'drawing histograms from the law and fitting each again',
  'shot order': 'shuffling the order of the shots',
  explanations: 'fitting what else it could be',
  writing: 'writing the result'
};

/** "43 %, about 12 s left: drawing histograms …", as far as it is known. */
export function progressWords({ share, step, elapsed }: Pick<JobRow, 'share' | 'step' | 'elapsed'>): string {
  const left = elapsed === null ? null : timeLeft(elapsed / 1000, share);
  const words =
    left === null
      ? ''
      : left < 1.5
        ? ', about a second left'
        : left < 90
          ? `, about ${Math.ceil(left)} s left`
          : `, about ${Math.ceil(left / 60)} min left`;
  return `${Math.floor(share * 100)}\u202f%${words}${step ? `: ${STEPS[step]}` : ''}`;
}
