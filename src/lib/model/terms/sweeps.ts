import type { Terms } from './term';

/** Words of a sweep over quench or hold time. */
export const SWEEPS = {
  'power-law': {
    name: 'power law and its exponent',
    words: [
      'A cumulant that falls by the same factor whenever the time grows by the same factor; the exponent b says by how much.',
      'Laws are fitted to the cumulants themselves with their joint errors, so that a small or negative third cumulant counts with its own error.'
    ],
    formula: ['κ_q = e^{c_q} τ^{−b_q}'],
    // Proc. Roy. Soc. Edinburgh 55:42.
    source: 'Aitken 1936'
  },
  'common-exponent': {
    name: 'one common exponent',
    words: [
      'The test that mean, variance and third cumulant fall with the same exponent, which they do when a single density governs the whole law.',
      'It is how much worse the fit becomes when the exponents are tied, and a refusal does not say which physics made it.'
    ],
    formula: ['Δχ^2 = χ^2_{"tied"} − χ^2_{"free"}'],
    source: ''
  },
  'expected-exponent': {
    name: 'exponent expected of a transition',
    words: [
      'The exponent of the defect number for a linear crossing, from the dimension d, the exponent ν of the correlation length and the dynamic exponent z.',
      'That an interval holds it does not tell the transition: other exponents give the same value.'
    ],
    formula: ['b = frac{d ν}{1 + z ν}'],
    source: 'Kibble 1976; Zurek 1985'
  },
  'sweep-window': {
    name: 'window of a sweep',
    words: [
      'The times that the power laws are fitted to, both ends included.',
      'Plateaus at the fast end and a background at the slow end end a power law, so look how the exponent moves as the window shrinks.'
    ],
    formula: ['τ_{"from"} ≤ τ ≤ τ_{"to"}'],
    source: ''
  },
  'cumulant-ratios': {
    name: 'ratios of cumulants',
    words: [
      'Variance and third cumulant over the mean, which stay the same over a sweep when one density governs the whole law.',
      'Landau–Zener kinks and coarsening from zero temperature have nearly the same ratios, so these do not tell the two apart.'
    ],
    formula: ['κ_2/κ_1 = 2 − sqrt{2} "for kinks"', 'κ_2/κ_1 = 1 − 1/sqrt{2} "for pairs"'],
    source: 'Dziarmaga 2005'
  },
  'pair-factor': {
    name: 'F₂/F₁²',
    words: [
      'The second factorial cumulant over the square of the mean, which loss of single defects, each by chance of its own, leaves as it is.',
      'Loss in pairs changes it, and so does drift, so a change says only that it was not loss of single defects alone.'
    ],
    formula: ['frac{F_2}{F_1^2} = frac{κ_2 − κ_1}{κ_1^2}'],
    source: 'Daley and Vere-Jones 2003'
  }
} satisfies Terms;
