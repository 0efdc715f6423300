/** What stands in the fields, as it was typed; a select's choice by its value. */
export const FRESH_PLAN = {
  find: 'excess',
  mean: '',
  trials: '',
  size: '',
  shots: '',
  alpha: '0.05',
  power: '0.8',
  most: '',
  counts: ''
};

export type PlanFields = typeof FRESH_PLAN;
export type PlanField = keyof PlanFields;
export type PlanProblems = Partial<Record<PlanField, string>>;

/** The effects in words: what to find, what its size is, and an example of one. */
export const EFFECTS = {
  excess: {
    name: 'an excess of the variance over its ceiling',
    size: 'Excess, as a part of the ceiling',
    help: 'Such as 0.1 for a variance a tenth above what independent trials can have.',
    short: 'excess'
  },
  pairs: {
    name: 'a correlation of all pairs of sites',
    size: 'Mean correlation of two sites',
    help: 'Such as 0.005. It makes an excess of (N − 1) times that.',
    short: 'mean pair correlation'
  },
  neighbours: {
    name: 'a coupling of neighbours along a line',
    size: 'Correlation of neighbouring sites',
    help: 'Such as 0.05; sites d apart are then correlated by its d-th power.',
    short: 'correlation of neighbours'
  },
  misread: {
    name: 'misread sites on an open chain of bonds',
    size: 'Chance to misread a site, ε',
    help: 'Such as 0.01, below 0.5. A misread site toggles two bonds, which looks like bunching.',
    short: 'misread rate'
  }
} as const;
