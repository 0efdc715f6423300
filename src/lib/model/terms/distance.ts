import type { Terms } from './term';

/** How far counts and law lie apart. */
export const DISTANCE = {
  divergence: {
    name: 'divergence',
    words: [
      'The Kullback–Leibler distance of the counts from a law, in nats a shot.',
      'It is never below 0, and chance alone keeps it above 0 even when the law is true.'
    ],
    formula: ['D = sum_n hat{p}_n ln frac{hat{p}_n}{f_n}', 'hat{p}_n = h_n/S'],
    // Ann. Math. Stat. 22:79 (m).
    source: 'Kullback and Leibler 1951',
    printed: true
  },
  'bias-corrected': {
    name: 'divergence, chance taken off',
    words: [
      'The divergence less the mean that counts drawn from the best law have after a fit of their own.',
      'What is left, with its interval, says how far the law really is; an interval that holds 0 says that it may not be far at all.'
    ],
    formula: ['D_c = D − "mean of" D_{"resampled"}'],
    source: 'Efron and Tibshirani 1993'
  },
  'g-squared': {
    name: 'G²',
    words: [
      'Twice the divergence times the number of shots, the statistic of the fit as a whole.',
      'Its p-value comes from refitted resamples and not from a χ² table, since levels at 0 and 1 spoil the degrees of freedom.'
    ],
    formula: ['G^2 = 2 S D'],
    source: 'Efron and Tibshirani 1993'
  },
  'shots-to-notice': {
    name: 'shots to notice',
    words: [
      'About how many shots make a distance of this size noticeable at the level of the answer.',
      'It is an order of magnitude and not a promise.'
    ],
    formula: ['S ≈ frac{ln(1/α)}{D}'],
    source: 'Sanov 1957'
  },
  'half-interval': {
    name: 'half-interval',
    words: [
      'How far the law lies from the share that was seen, in units of the 95 % interval on that side.',
      'Within −1 and 1 the interval holds the law; about one count in twenty misses by chance alone.'
    ],
    formula: [
      'r_n = frac{hat{p}_n − f_n}{hat{p}_n − "low"}',
      '"or over high" − hat{p}_n "when" f_n > hat{p}_n'
    ],
    source: ''
  },
  interval: {
    name: '95 % interval',
    words: [
      'The values that the data do not speak against at 5 %, 2.5 % on each side: exact for shares of shots, from resamples for moments.',
      'In at least 95 of 100 repeats of the experiment the interval of a share holds the true one.'
    ],
    formula: ['P("Bin"(S, p_{"low"}) ≥ h) = 0.025', 'P("Bin"(S, p_{"high"}) ≤ h) = 0.025'],
    source: 'Clopper and Pearson 1934'
  }
} satisfies Terms;
