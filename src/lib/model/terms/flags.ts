import type { FlagId } from '$lib/stats/types';
import type { Term, Terms } from './term';

/** What each flag says. */
const EACH = {
  'flag-bunching': {
    name: 'bunching',
    words: [
      'The variance is over its ceiling, and not by one tail alone: defects come together.',
      'Drift, pooled runs, misreads on bonds and boundary pairing look the same.'
    ],
    formula: ['s^2 > μ(1 − μ/N)'],
    source: ''
  },
  'flag-bursts': {
    name: 'bursts',
    words: [
      'Only the high tail is heavy: now and then a shot has far too many defects.',
      'Cosmic rays, spurious resets and other rare events do that.'
    ],
    formula: ['T_n > S F_n', 'F_n = P(X ≥ n)', 'n "far above" μ'],
    source: ''
  },
  'flag-coarsening': {
    name: 'coarsening',
    words: [
      'Only the low tail is heavy with the empty shots set aside, as when defects meet and vanish in pairs.',
      'Dead shots, post-selection and slow drift look the same.'
    ],
    formula: ['n "becomes" n − 2'],
    source: ''
  },
  'flag-pairing': {
    name: 'pairing',
    words: [
      'Even counts, or odd ones, are preferred.',
      'On a ring that is geometry and the unit should be the pair; on a chain the ends may favour one phase.'
    ],
    formula: ['|E(−1)^X| > prod_k |1−2p_k|'],
    source: ''
  },
  'flag-dead-shots': {
    name: 'dead shots',
    words: [
      'Too many shots are empty for the shots that are not.',
      'Failed preparation and lost atoms do that; drop such shots by a flag of the apparatus and never by their count.'
    ],
    formula: ['h_0 > S f_0'],
    source: ''
  },
  'flag-drift': {
    name: 'drift',
    words: [
      'Batches differ, or the order of the shots matters.',
      'A probability that moves between shots widens the counts exactly as bunching does.'
    ],
    formula: ['frac{κ_2}{"ceiling"} = 1 + frac{(N−1) "Var"(p)}{p(1−p)}'],
    source: ''
  },
  'flag-misreads': {
    name: 'misreads',
    words: [
      'A misread rate under 10 % a site would by itself give this mean and variance.',
      'It is never more than a hint, since the counts cannot tell misread sites from defects that come together.'
    ],
    formula: ['p_{"read"} = p + 2ε(1−ε)(1−2p)'],
    source: ''
  },
  'flag-regular': {
    name: 'regular',
    words: [
      'The variance lies well below its ceiling, which is a remark and no violation.',
      'Uneven probabilities, repulsion and dropped shots all give it.'
    ],
    formula: ['s^2 < μ(1 − μ/N)'],
    source: ''
  }
} satisfies Record<`flag-${FlagId}`, Term>;

/** What the counts point to. */
export const FLAG_TERMS = {
  flag: {
    name: 'flag',
    words: [
      'A kind of departure that the tests together point to, shown or only hinted at.',
      'It always comes with the other causes that would look the same, and with what would tell them apart.'
    ],
    formula: ['"shown:" p ≤ α "after all tests"'],
    source: ''
  },
  ...EACH
} satisfies Terms;
