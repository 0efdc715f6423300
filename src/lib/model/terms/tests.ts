import type { TestId } from '$lib/stats/types';
import type { Term, Terms } from './term';

/** What each test looks at. */
const EACH = {
  'test-ceiling': {
    name: 'variance over the ceiling',
    words: [
      'Is the variance larger than that of equal trials with the same mean?',
      'Resamples come from equal trials, which scatter most among all independent ones.'
    ],
    formula: ['s^2 − hat{μ}(1 − hat{μ}/N)'],
    source: 'Efron and Tibshirani 1993'
  },
  'test-fit': {
    name: 'fit as a whole',
    words: [
      'Do the counts lie further from the best law than counts drawn from it lie from theirs?',
      'It sees any kind of departure, and is less sharp for each than a test made for it.'
    ],
    formula: ['G^2 = 2 S D'],
    source: 'Efron and Tibshirani 1993'
  },
  'test-high-tail': {
    name: 'high tail',
    words: [
      'Do more shots than the best law explains have many defects?',
      'The largest standardised excess beyond one σ counts, so it need not be said beforehand where to look.'
    ],
    formula: [
      'max_{n>μ+σ} sqrt{2 S d_n}',
      'd_n = t ln frac{t}{F_n} + (1−t) ln frac{1−t}{1−F_n}',
      't = T_n/S,  F_n = P(X ≥ n)'
    ],
    source: 'Efron and Tibshirani 1993'
  },
  'test-low-tail': {
    name: 'low tail',
    words: [
      'Do more shots than the best law explains have few defects?',
      'It works as the test of the high tail does, from one σ below the mean downward.'
    ],
    formula: ['max_{n<μ−σ} sqrt{2 S d_n}', 'F_n = P(X ≤ n)'],
    source: 'Efron and Tibshirani 1993'
  },
  'test-parity': {
    name: 'even and odd counts',
    words: [
      'Are even counts, or odd ones, preferred beyond what the best law gives?',
      'Defects that enter or leave in pairs do that.'
    ],
    formula: ['frac{|S_{"even"} − S P|}{sqrt{S P(1−P)}}', 'P = frac{1}{2}(1 + prod_k (1−2p_k))'],
    source: ''
  },
  'test-empty-shots': {
    name: 'empty shots',
    words: [
      'Are there more shots without any defect than the law of the other shots expects?',
      'The statistic is the likelihood gained when the share of empty shots is set free.'
    ],
    formula: ['h_0 "against" S f_0'],
    source: 'Efron and Tibshirani 1993'
  },
  'test-batches': {
    name: 'between batches',
    words: [
      'Do the means of the batches differ more than those of shuffled shots?',
      'It needs a list of shots with their batches; a histogram has lost them.'
    ],
    formula: ['sum_b S_b(hat{μ}_b − hat{μ})^2'],
    source: 'Efron and Tibshirani 1993'
  },
  'test-order': {
    name: 'order of the shots',
    words: [
      'Does a count depend on those shortly before it, or do high and low ones come in runs?',
      'Shuffled shots show what chance does; an early or late part of the day that differs shows up here.'
    ],
    formula: ['Q = S(S+2) sum_{l=1}^m frac{r_l^2}{S−l}'],
    source: 'Ljung and Box 1978'
  }
} satisfies Record<`test-${TestId}`, Term>;

/** How a p-value comes about. */
export const TEST_TERMS = {
  'within-batches': {
    name: 'within batches',
    words: [
      'The scatter of the shots about the mean of their own batch, summed over all batches and set against what equal trials with the total of each batch give.',
      'A rate that differs from batch to batch leaves no trace in it, so an excess that is still there is not drift between batches.'
    ],
    formula: [
      'sum_b sum_{i∈b} (n_i − n_b)^2',
      '"mean" sum_b frac{(S_b−1) T_b (M_b−T_b)}{S_b (M_b−1)}',
      'M_b = S_b N'
    ],
    source: 'Haldane 1937'
  },
  'change-of-mean': {
    name: 'change of the mean',
    words: [
      'The shot at which cutting the list in two gives the means that differ most, for their errors.',
      'Shuffled shots show how well chance supports a change, the search over all places allowed for.'
    ],
    formula: ['max_k frac{k(S−k)}{S s^2} (m_1 − m_2)^2'],
    source: 'Hinkley 1970'
  },
  'running-mean': {
    name: 'mean over time',
    words: [
      'Means of stretches of shots in the order taken, with limits of three standard errors about the mean of all shots.',
      'The errors come from differences of neighbouring shots, which drift hardly widens.'
    ],
    formula: ['m ± frac{3 d}{sqrt{k}}', 'd^2 = sum_i frac{(n_{i+1}−n_i)^2}{2(S−1)}'],
    source: 'Shewhart 1931'
  },
  'p-value': {
    name: 'p',
    words: [
      'How often independent trials would give a result at least as extreme as this one.',
      'It is not the probability that the defects are independent.'
    ],
    formula: ['p = P(T ≥ t)'],
    source: ''
  },
  holm: {
    name: 'p, all tests',
    words: [
      'The p-values raised together, since several tests give several chances to cry wolf.',
      'The answer uses the raised ones: all tests together then give a false alarm at most as often as the level says.'
    ],
    formula: ['p_{(i)}^{"all"} = max_{j≤i} (m−j+1)p_{(j)}', '"and at most" 1'],
    source: 'Holm 1979',
    printed: true
  },
  resample: {
    name: 'resample',
    words: [
      'A histogram of as many shots drawn from the law that is tested, fitted anew and measured like the real one.',
      'The share of resamples at least as extreme gives the p-value.'
    ],
    formula: ['p = frac{1 + x}{B + 1}', 'x "at least as extreme"'],
    source: 'Efron and Tibshirani 1993'
  },
  permutation: {
    name: 'permuted',
    words: [
      'The same shots in shuffled order, measured again.',
      'It assumes nothing about the law of the counts; for long lists the limit of shuffling stands in.'
    ],
    formula: ['p = frac{1 + x}{B + 1}', 'x "at least as extreme"'],
    source: 'Efron and Tibshirani 1993'
  },
  'smallest-p': {
    name: 'smallest p',
    words: [
      'The smallest p-value that a test could have shown with the resamples it was given.',
      'A test that reaches it says only that p is at most that; the truth may be smaller.'
    ],
    formula: ['p_{"least"} = frac{1}{B+1}'],
    source: ''
  },
  'early-stop': {
    name: 'ended early',
    words: [
      'Drawing ends once 100 resamples were at least as extreme as the data, since the case is then clear.',
      'The p-value stays fair: it is 100 over the number drawn.'
    ],
    formula: ['p = 100/l'],
    source: 'Besag and Clifford 1991'
  },
  ...EACH
} satisfies Terms;
