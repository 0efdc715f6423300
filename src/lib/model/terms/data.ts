import type { Terms } from './term';

/** What was measured. */
export const DATA = {
  shot: {
    name: 'shot',
    words: [
      'One repeat of the experiment, from preparation to read-out, which gives one count.',
      'Shots are taken to be alike and independent of each other; when they are not, the counts look bunched.'
    ],
    formula: ['S = sum_n h_n'],
    source: ''
  },
  count: {
    name: 'count',
    words: [
      'The number n of defects seen in one shot.',
      'A histogram keeps how many shots h had each count, and forgets which places held the defects.'
    ],
    formula: ['n = sum_{k=1}^N x_k', 'x_k "is 0 or 1"'],
    source: ''
  },
  trials: {
    name: 'trials, N',
    words: [
      'The places of one shot, such as sites, bonds or modes, each of which holds one defect or none.',
      'N is the largest count possible and needs a reason from the apparatus, since the ceiling rests on it.'
    ],
    formula: ['0 ≤ n ≤ N'],
    source: '',
    printed: true
  },
  density: {
    name: 'density',
    words: [
      'The count divided by the number of trials.',
      'It lets experiments of different size share one axis.'
    ],
    formula: ['ρ = n/N'],
    source: ''
  },
  pair: {
    name: 'unit: pair',
    words: [
      'On a ring the kinks come two by two, so every count is even and the pair is the thing that can be independent.',
      'Half of the count is then tested against half of the trials.'
    ],
    formula: ['n/2 "pairs of" N/2'],
    source: ''
  },
  geometry: {
    name: 'geometry',
    words: [
      'Whether defects are counted on sites, on the bonds of an open chain, or on the bonds of a ring.',
      'It decides what one misread site does: one count on sites, two neighbouring bonds on a chain or ring.'
    ],
    formula: ['"kink on bond" k: s_k ≠ s_{k+1}'],
    source: ''
  },
  kept: {
    name: 'counts kept',
    words: [
      'The range outside which shots were dropped before they were counted, as whoever did it states.',
      'Dropping shots makes counts look regular, so the laws, the ceiling and the tests are then those of counts cut in the same way.'
    ],
    formula: ['frac{f_n}{f_a + … + f_b}', 'a ≤ n ≤ b'],
    source: ''
  },
  'misread-rate': {
    name: 'misread rate, ε',
    words: [
      'The probability that one site is read wrongly.',
      'On a chain or ring a wrong site toggles the two bonds beside it, so independent kinks look bunched; round a ring counts stay even.'
    ],
    formula: ['p_{"read"} = p + 2ε(1−ε)(1−2p)'],
    source: ''
  },
  'needed-rate': {
    name: 'misread rate needed',
    words: [
      'The misread rate of a site at which equal independent kinks would have the mean and variance that were seen.',
      'Hold it against the calibration: a rate that was measured to be smaller leaves an excess which misreads do not explain.'
    ],
    formula: ['N(p + 2ε(1−ε)(1−2p)) = hat{μ}', '"variance as read" = s^2'],
    source: ''
  },
  lump: {
    name: 'lump',
    words: [
      'A row such as “10 or more” or “2 or fewer”, in which a printed table puts its rarest counts together.',
      'Its likelihood is the sum of the law over these counts, and none of them is invented.'
    ],
    formula: ['P(X ≥ c) = sum_{n≥c} f_n'],
    source: ''
  }
} satisfies Terms;
