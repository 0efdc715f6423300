import type { Terms } from './term';

/** Rates, tails and what bounds them. */
export const RATES = {
  'rate-function': {
    name: 'rate function',
    words: [
      'Minus the logarithm of how often a count is seen, divided by N when that is known.',
      'The likeliest count has the smallest rate; the larger the rate, the rarer the count.'
    ],
    formula: ['hat{I}(n/N) = −frac{1}{N} ln frac{h_n}{S}'],
    source: 'Sanov 1957'
  },
  'large-deviation-limit': {
    name: 'large-deviation limit',
    words: [
      'What the rate of the best law tends to when N grows with the same mix of probabilities.',
      'It leaves out a prefactor of about ln(2πNσ²)/(2N), so the data belong to the finite-N curve and not to this one.'
    ],
    formula: ['I(ρ) = sup_θ [θρ − Λ(θ)/N]', 'Λ(θ) = sum_k ln(1 + p_k(e^θ − 1))'],
    source: 'Gärtner 1977; Ellis 1984'
  },
  'gaussian-curve': {
    name: 'Gaussian curve',
    words: [
      'The parabola of the central limit, with the mean and variance of the best law.',
      'It holds near the mean only: where it leaves the law, the difference is no finding about the counts.'
    ],
    formula: ['I_G(ρ) = frac{N(ρ − hat{ρ})^2}{2σ^2}'],
    source: ''
  },
  'shot-horizon': {
    name: 'shot horizon',
    words: [
      'The rate of a count seen once, the largest rate that S shots can show at all.',
      'A count that was never seen has at least the second rate, at 95 %, and nothing more can be read of it.'
    ],
    formula: ['frac{ln S}{N}', '"never seen:" ≥ −frac{1}{N} ln(1 − 0.05^{1/S})'],
    source: ''
  },
  tail: {
    name: 'tail',
    words: [
      'All shots with a count at least as large as n, or at most as small.',
      'A tail sums rare counts, so it shows an excess that no single count could.'
    ],
    formula: ['T_n = sum_{m≥n} h_m'],
    source: ''
  },
  chernoff: {
    name: 'Chernoff bound',
    words: [
      'A simple upper limit on a tail of the best law, from its rate function.',
      'It is never passed by that law and is too generous by a factor that grows slowly with N.'
    ],
    formula: ['P(X ≥ n) ≤ e^{−N I(n/N)}', 'n > μ'],
    source: 'Chernoff 1952'
  },
  'mean-chernoff': {
    name: 'Chernoff bound, mean alone',
    words: [
      'The same limit for every independent-trial law with this mean, whatever its probabilities.',
      'It needs no fit, but is wider than Hoeffding’s.'
    ],
    formula: ['I(ρ) = ρ ln frac{ρ}{m} + (1−ρ) ln frac{1−ρ}{1−m}', 'm = μ/N'],
    source: 'Chernoff 1952'
  },
  hoeffding: {
    name: 'Hoeffding bound',
    words: [
      'With this mean no independent trials put more probability into a tail than equal trials do.',
      'It holds from one count beyond the mean outward, without a fit, and draws the hatched edge.'
    ],
    formula: ['P(X ≥ c) ≤ P(B ≥ c)', 'B ~ "Bin"(N, μ/N),  c ≥ μ + 1'],
    source: 'Hoeffding 1956',
    printed: true
  },
  certificate: {
    name: 'certificate',
    words: [
      'An exact p-value from the most telling tail: it uses Hoeffding’s bound at the unfavourable end of an interval for the mean, and allows for all m counts tried.',
      'It rests on no fit and no simulation, only on shots that are alike and independent of each other.'
    ],
    formula: ['p_n = P("Bin"(S, B_n) ≥ T_n)', 'p = min(1, m p_{"least"} + β)', 'β = 10^{−6}'],
    source: 'Hoeffding 1956; Berger and Boos 1994',
    printed: true
  }
} satisfies Terms;
