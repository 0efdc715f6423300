import { progressWords } from '$lib/page/team/jobs/job-words';
import { expect, it } from 'vitest';

it.each([
  [0, null, null, '0\u202f%'],
  [
    0.5,
    'resampling',
    10_000,
    '50\u202f%, about 10 s left: drawing histograms from the law and fitting each again'
  ],
  [0.02, 'fit', 10_000, '2\u202f%: fitting the best law'],
  [
    0.1,
    'resampling',
    60_000,
    '10\u202f%, about 9 min left: drawing histograms from the law and fitting each again'
  ],
  [0.97, 'writing', 20_000, '97\u202f%, about a second left: writing the result']
] as const)('says how far a job is (%s)', (share, step, elapsed, words) => {
  expect(progressWords({ share, step, elapsed })).toBe(words);
});
