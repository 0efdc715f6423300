/** The tests of a diagnosis, in the order in which it lists them. */
export const testIds = [
  'ceiling',
  'fit',
  'high-tail',
  'low-tail',
  'parity',
  'empty-shots',
  'batches',
  'order'
] as const;

export type TestId = (typeof testIds)[number];
