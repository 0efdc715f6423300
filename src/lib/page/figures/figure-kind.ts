/** The charts of a report. */
export type FigureKind =
  'distribution' | 'rate' | 'tails' | 'ceiling' | 'region' | 'tests' | 'explanations' | 'drift' | 'trials';
