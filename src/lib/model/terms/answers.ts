import type { Terms } from './term';

/** The answer, and what makes it come out the same again. */
export const ANSWERS = {
  answer: {
    name: 'answer',
    words: [
      'Ruled out, when the certificate or a raised p-value reaches the level; compatible, when none does and an excess that matters would have shown; undecided otherwise.',
      'Compatible is not independent, and ruled out does not say by what.'
    ],
    formula: ['"ruled out:" p ≤ α', '"compatible:" r_{"high"} < 1 + τ', 'r = s^2/"ceiling"'],
    source: ''
  },
  alpha: {
    name: 'level, α',
    words: [
      'What the certificate or a raised p-value must reach for independent trials to be ruled out, 0.01 unless you change it.',
      'Set it before you look at the counts.'
    ],
    formula: ['p ≤ α'],
    source: ''
  },
  tolerance: {
    name: 'tolerance, τ',
    words: [
      'The excess of the variance over its ceiling that would matter to you, 10 % unless you change it.',
      'Compatible means that an excess this large is excluded with 95 % confidence.'
    ],
    formula: ['frac{s^2}{μ(1−μ/N)} = 1 + τ'],
    source: ''
  },
  'smallest-excess': {
    name: 'smallest excess',
    words: [
      'The excess over the ceiling that these shots would show in four of five repeats, by the variance alone at a level of 5 %.',
      'A smaller one may be there and stay unseen.'
    ],
    formula: ['2.49 sqrt{2(1 − 1/N)/S}'],
    source: ''
  },
  'shots-to-decide': {
    name: 'shots to decide',
    words: [
      'About how many shots in all would turn undecided into one of the other answers, if the variance stays where it is.',
      'The interval of the variance narrows with the square root of the shots.'
    ],
    formula: [
      'S = 2(1 − 1/N) frac{2.80^2}{(τ − x)^2}',
      '"or, if fewer, with" frac{(z_{α/m} + 0.84)^2}{x^2}',
      'x = s^2/"ceiling" − 1'
    ],
    source: ''
  },
  seed: {
    name: 'seed',
    words: [
      'The number from which every random draw of the resamples starts.',
      'Same counts, options, seed and engine give the same document byte for byte; another seed moves a resampled p-value by its sampling error.'
    ],
    formula: ['sqrt{p(1−p)/B}'],
    source: ''
  },
  digest: {
    name: 'digest',
    words: [
      'The sha256 sum of the histogram in a fixed spelling.',
      'Two results with the same digest are about the same counts, whatever file they came in.'
    ],
    formula: ['"sha256"(n_1:h_1, n_2:h_2, …)'],
    source: ''
  },
  quote: {
    name: 'words to quote',
    words: [
      'The result, a methods paragraph and a citation, all written from the one document of this report.',
      'The citation carries the sha256 of that document, so a reader who has the file can see that it is the same.'
    ],
    formula: ['"sha256"("document")'],
    source: ''
  }
} satisfies Terms;
