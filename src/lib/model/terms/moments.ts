import type { Terms } from './term';

/** Mean, variance and the numbers made of them. */
export const MOMENTS = {
  cumulants: {
    name: 'cumulants, κ₁ to κ₄',
    words: [
      'Mean, variance and the two next measures of shape; they add up over independent trials.',
      'The third tells the tilt of the counts and the fourth their tails, and both need many shots.'
    ],
    formula: [
      'κ_1 = sum_k p_k',
      'κ_2 = sum_k p_k(1−p_k)',
      'κ_3 = sum_k p_k(1−p_k)(1−2p_k)',
      'κ_4 = sum_k q_k(1−6q_k)',
      'q_k = p_k(1−p_k)'
    ],
    source: ''
  },
  fano: {
    name: 'Fano factor',
    words: [
      'Variance over mean, 1 for rare events.',
      'Further above 1 than chance explains, no independent trials give it whatever N is; a value below 1 means little until N is known.'
    ],
    formula: ['F = κ_2/κ_1'],
    // Phys. Rev. 72:26 (m).
    source: 'Fano 1947'
  },
  ceiling: {
    name: 'ceiling',
    words: [
      'The largest variance that independent trials with this mean can have, which equal trials reach.',
      'With N unknown it is the mean itself.'
    ],
    formula: ['κ_2 ≤ μ(1 − μ/N)'],
    source: '',
    printed: true
  },
  dispersion: {
    name: 'variance over ceiling',
    words: [
      'The variance of the counts in units of its ceiling.',
      'Further above 1 than chance explains, nothing independent gives it; below 1 the trials differ or the defects keep apart, and the variance cannot tell which.'
    ],
    formula: ['frac{s^2}{μ(1 − μ/N)}'],
    source: ''
  },
  'critical-trials': {
    name: 'critical trials',
    words: [
      'The number of trials at which the ceiling equals the variance that was seen.',
      'With fewer trials the counts are over the ceiling; a variance above the mean is over it with any number.'
    ],
    formula: ['N_{"crit"} = frac{μ^2}{μ − s^2}'],
    source: ''
  },
  'pair-covariance': {
    name: 'pair covariance',
    words: [
      'Variance minus ceiling, which is the least that the covariances of all pairs of trials must add up to.',
      'Divided by N(N − 1) it is a lower limit for the mean covariance of two places.'
    ],
    formula: ['sum_{j≠k} "Cov"(x_j, x_k) ≥ s^2 − μ(1 − μ/N)'],
    source: ''
  },
  'cumulant-region': {
    name: 'region of cumulants',
    words: [
      'The variance and the third cumulant, each over the mean, that independent trials of this mean can have.',
      'A point outside it speaks against them only as far as its intervals stay outside too.'
    ],
    formula: [
      'frac{κ_3}{κ_1} ≥ F(2F − 1)',
      'frac{κ_3}{κ_1} ≤ F − 2F^2 frac{ρ}{1−ρ}',
      'F = κ_2/κ_1,  ρ = μ/N'
    ],
    source: ''
  },
  'misread-ceiling': {
    name: 'ceiling of kinks as read',
    words: [
      'The largest variance that independent kinks of this mean can have once their sites are misread at the stated rate.',
      'It takes the place of the plain ceiling, so a variance over it is more than those misreads give; the formula is that of an open chain, and on a ring the largest variance that searches found stands for it.'
    ],
    formula: [
      'frac{1}{4}[N − min sum_{j,k} A_{jk} m_j m_k]',
      'A_{jj} = u^4',
      'A_{j,j+1} = A_{j+1,j} = −u^2(1−u^2)',
      'm_k = 1 − 2p_k,  u = 1 − 2ε',
      'sum_k m_k = (N − 2μ)/u^2'
    ],
    source: ''
  }
} satisfies Terms;
