/** What a webhook may be told of, by the names of the events, and in words. */
export const TOLD_ACTIONS = {
  'dataset.upload': 'a dataset was uploaded',
  'report.make': 'a diagnosis ended with a report',
  'job.fail': 'a diagnosis ended without a report',
  'remark.add': 'somebody remarked on a report',
  'sweep.make': 'a sweep was saved',
  'gate.pass': 'a gate was passed',
  'gate.fail': 'a gate was failed',
  'gate.undecided': 'a gate stayed undecided'
} as const;

export type ToldAction = keyof typeof TOLD_ACTIONS;
