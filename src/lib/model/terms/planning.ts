import type { Terms } from './term';

/** Words of the pages for published cumulants and for planning. */
export const PLANNING = {
  'moment-body': {
    name: 'moment body',
    words: [
      'Everything that the first cumulants of independent trials can be together: a convex body, bounded by inequalities between them.',
      'A point outside it speaks against such trials as far as its errors allow; a point inside says only that some have it.'
    ],
    formula: ['s_r = sum_k p_k^r,  0 ≤ p_k ≤ 1', 's_2^2 ≤ s_1 s_3', 's_1^2 ≤ N s_2'],
    source: 'Shohat and Tamarkin 1943'
  },
  power: {
    name: 'power',
    words: [
      'How often an experiment of this size shows an effect of this size, if the effect is there.',
      'At 0.8 one repeat in five still misses it.'
    ],
    formula: ['"power" = P(s^2/"ceiling" > "cut")'],
    source: ''
  },
  'planned-shots': {
    name: 'shots for an effect',
    words: [
      'The fewest shots with which the ceiling test at this level sees the effect with this power.',
      'They grow with the inverse square of the excess that the effect makes.'
    ],
    formula: ['S ≈ 2 frac{(z_α + z_{"power"})^2}{x^2}', 'x = s^2/"ceiling" − 1'],
    source: ''
  },
  'lucky-shot': {
    name: 'lucky shot',
    words: [
      'A shot with at most a chosen number of defects.',
      'Among many independent sites it is exponentially rare, so waiting for one seldom replaces fewer defects on average.'
    ],
    formula: ['P(n ≤ n_*) ≤ e^{−N I(n_*/N)}', '"shots until one:" 1/P'],
    source: 'Chernoff 1952'
  }
} satisfies Terms;
