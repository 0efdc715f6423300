import type { Terms } from './term';

/** The laws that counts are held against. */
export const LAWS = {
  'poisson-binomial': {
    name: 'Poisson-binomial law',
    words: [
      'The law of a count that is a sum of independent trials, each with a probability of its own.',
      'Some interacting systems have exactly this law, so agreeing with it does not show independence.'
    ],
    formula: ['G(z) = prod_{k=1}^N (1 − p_k + p_k z)'],
    source: 'Pitman 1997; Hong 2013',
    printed: true
  },
  'best-law': {
    name: 'best law',
    words: [
      'Of all independent-trial laws the one under which these counts are most likely.',
      'Its mean is the mean of the counts, and the floor beside it says how much closer any other could come.'
    ],
    formula: ['f "maximises" sum_n h_n ln f_n'],
    source: 'Pitman 1997; Hong 2013'
  },
  levels: {
    name: 'levels',
    words: [
      'The distinct probabilities of the best law, each with the number of trials that share it.',
      'Counts resolve only a few of them, so the levels describe the law and not the places of the device.'
    ],
    formula: ['G(z) = prod_j (1 − p_j + p_j z)^{m_j}', 'sum_j m_j = N'],
    source: 'Hong 2013'
  },
  'poisson-part': {
    name: 'Poisson part',
    words: [
      'Very many trials of tiny probability, which stand beside the others when N is unknown.',
      'Only their mean γ can be told from the counts.'
    ],
    formula: ['G(z) = e^{γ(z−1)} prod_k (1 − p_k + p_k z)'],
    source: 'Aissen, Schoenberg, Whitney and Edrei 1951'
  },
  likelihood: {
    name: 'log-likelihood',
    words: [
      'How probable a law makes the counts that were seen, as a logarithm summed over shots.',
      'Only differences between laws mean something: a difference of 1 is a factor of e.'
    ],
    formula: ['L = sum_n h_n ln f_n'],
    source: ''
  },
  'reference-laws': {
    name: 'other laws',
    words: [
      'Laws with a story, held against the same counts: equal trials, rare events, a Gaussian of the same two moments, Landau–Zener modes, and a law you supply.',
      'A Gaussian or Poisson law may lie closer than any sum of trials, since neither ends at N.'
    ],
    formula: ['f_n = frac{N!}{n!(N−n)!} p^n (1−p)^{N−n}', 'f_n = e^{−μ} μ^n/n!'],
    source: 'Le Cam 1960'
  },
  'landau-zener': {
    name: 'Landau–Zener modes',
    words: [
      'Independent modes of a chain driven through its critical point, each of which makes a pair of kinks with a probability set by its wave number.',
      'One parameter a, which grows with the quench time, holds the whole law.'
    ],
    formula: ['p_j = e^{−a k_j^2}', 'k_j = (2j−1)π/L'],
    source: 'Landau 1932; Zener 1932; Dziarmaga 2005'
  },
  aic: {
    name: 'AIC',
    words: [
      'Minus twice the log-likelihood, and two more for each number that was fitted.',
      'It ranks laws by what they cost and what they explain: a smaller one is better, and differences under about 2 say little.'
    ],
    formula: ['"AIC" = 2k − 2L'],
    // IEEE Trans. Autom. Control 19:716 (m).
    source: 'Akaike 1974'
  },
  floor: {
    name: 'floor',
    words: [
      'The smallest distance that any law obeying Newton’s inequalities can have from the counts, and every independent-trial law obeys them.',
      'Where floor and best law meet, nothing better was missed; where they differ, the gap is the most that could have been.'
    ],
    formula: ['D_{"floor"} ≤ D_{"best"}'],
    source: 'Pitman 1997',
    printed: true
  },
  newton: {
    name: 'Newton’s inequalities',
    words: [
      'What real zeros of the generating function force on neighbouring counts.',
      'Every independent-trial law obeys them, though not every law that does is one.'
    ],
    formula: ['frac{f_n^2}{f_{n−1} f_{n+1}} ≥ (1 + frac{1}{n})(1 + frac{1}{N−n})'],
    source: 'Pitman 1997'
  }
} satisfies Terms;
