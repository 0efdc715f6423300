/** A formula of the method. */
export interface MethodFormula {
  name: string;
  /** As pages set it (terms/Formula). */
  line: string;
  /** As the PDF sets it, and as it is read out there. */
  printed: string;
  alt: string;
  words: string;
}

/** The formulas behind a report, on the page and in the PDF. */
export const METHOD_FORMULAS: readonly MethodFormula[] = [
  {
    name: 'Independent trials',
    line: 'G(z) = prod_k (1 − p_k + p_k z)',
    printed: 'G(z) = ∏_k (1 − p_k + p_k z)',
    alt: 'G of z equals the product over k of 1 minus p k plus p k times z',
    words:
      'A count is a sum of independent trials when its generating function has this form, with any probabilities. With N unknown a Poisson part stands beside them.'
  },
  {
    name: 'Ceiling',
    line: 'κ_2 ≤ μ(1 − μ/N)',
    printed: 'κ_2 ≤ μ(1 − μ/N)',
    alt: 'kappa 2 is at most mu times 1 minus mu over N',
    words: 'The variance of any such count, with mean μ. N unknown: at most μ.'
  },
  {
    name: 'Misread kinks',
    line: 'κ_2 = frac{1}{4} [N(1 − m^2 u^4) + 2(N − 1) m^2 u^2 (1 − u^2)]',
    printed: 'κ_2 = ¼[N(1 − m^2u^4) + 2(N − 1)m^2u^2(1 − u^2)]',
    alt: 'kappa 2 equals one quarter of the sum of N times 1 minus m squared u to the fourth, and 2 times N minus 1 times m squared u squared times 1 minus u squared',
    words:
      'Where a misread rate ε of kinks is stated: the variance of equal ones on an open chain as they are read, with m\u00a0=\u00a01\u00a0−\u00a02p and u\u00a0=\u00a01\u00a0−\u00a02ε. The largest over all probabilities takes the place of the ceiling, and a bound of its own that of the tails. Round a ring the total is even besides.'
  },
  {
    name: 'Rate',
    line: 'hat{I}(n/N) = −frac{1}{N} ln frac{h_n}{S}',
    printed: 'Î(n/N) = −(1/N) ln(h_n/S)',
    alt: 'I hat of n over N equals minus 1 over N times the logarithm of h n over S',
    words: 'Seen rate of count n, in nats; its interval is the exact one of the share, carried through.'
  },
  {
    name: 'Limit',
    line: 'I(ρ) = sup_θ [θρ − frac{1}{N} sum_k ln(1 + p_k(e^θ − 1))]',
    printed: 'I(ρ) = sup_θ [θρ − (1/N) ∑_k ln(1 + p_k(e^θ − 1))]',
    alt: 'I of rho equals the supremum over theta of theta rho minus 1 over N times the sum over k of the logarithm of 1 plus p k times e to the theta minus 1',
    words: 'Large-deviation limit of the law, and the exponent of its Chernoff bound.'
  },
  {
    name: 'Tails',
    line: 'P(X ≥ c) ≤ P(B ≥ c),  B ~ "Bin"(N, μ/N)',
    printed: 'P(X ≥ c) ≤ P(B ≥ c),  B ∼ Bin(N, μ/N)',
    alt: 'The probability of X at least c is at most that of B at least c, with B binomial with N trials and mean mu',
    words: 'Hoeffding, for c at least one above the mean; likewise below.'
  },
  {
    name: 'Distance',
    line: 'D = sum_n frac{h_n}{S} ln frac{h_n/S}{f_n},  G^2 = 2 S D',
    printed: 'D = ∑_n (h_n/S) ln((h_n/S)/f_n),  G^2 = 2SD',
    alt: 'D equals the sum over n of h n over S times the logarithm of h n over S over f n; G squared equals 2 S D',
    words: 'Divergence of the counts from the law f, in nats a shot.'
  }
];
