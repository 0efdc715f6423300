/** What stands in the fields, as it was typed. */
export const FRESH_CUMULANTS = {
  mean: '',
  'mean-error': '',
  variance: '',
  'variance-error': '',
  third: '',
  'third-error': '',
  fourth: '',
  'fourth-error': '',
  trials: ''
};

export type CumulantFields = typeof FRESH_CUMULANTS;
export type CumulantField = keyof CumulantFields;
