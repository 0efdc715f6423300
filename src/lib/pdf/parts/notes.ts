import type { MarginNote } from '../blocks/blocks';

/** What terms mean, in the margin: the page's own notes, for paper. */
export const NOTES = {
  answers: {
    title: 'Three answers',
    paragraphs: [
      'Ruled out: no independent trials, whatever their probabilities, give such counts at the level asked for. Compatible: some do, and an excess that matters would have shown. Undecided: some do, but these shots could not have shown it.'
    ]
  },
  ceiling: {
    title: 'The ceiling',
    paragraphs: [
      'Trials that are independent give a count whose variance is at most μ(1 − μ/N), with μ the mean. Equal trials reach it; unequal ones stay below; nothing independent goes above.'
    ]
  },
  halfIntervals: {
    title: 'Half-intervals',
    paragraphs: [
      'The lower strip of the chart measures how far the law lies from each count in units of the 95 % interval on that side. Within −1 and 1 the interval holds the law. About one count in twenty misses by chance alone.'
    ]
  },
  bestLaw: {
    title: 'The best law',
    paragraphs: [
      'Of all independent-trial laws, each trial with a probability of its own, the one under which these counts are most likely. It has the mean of the counts.'
    ]
  },
  nats: {
    title: 'Nats a shot',
    paragraphs: [
      'The Kullback–Leibler divergence of the counts from the law. Chance alone gives some; what is left once that is taken off, and its interval, say how far the law really is. ln(1/α) divided by that is about how many shots show it at level α.'
    ]
  },
  poisson: {
    title: 'The Poisson law',
    paragraphs: [
      'A Poisson law has no largest count. With N known it is not one of the laws compared, which all end at N: it may lie closer to the counts than any of them, and stands there for reference.'
    ]
  },
  rate: {
    title: 'Rate',
    paragraphs: [
      'Minus the logarithm of how often a count is seen, divided by N when that is known. A rate of 0 is the likeliest count; the larger the rate, the rarer the count.'
    ]
  },
  horizon: {
    title: 'Shot horizon',
    paragraphs: [
      'A count seen in a single shot has the rate ln(S)/N; rarer ones show up by luck alone. No one should read the data beyond that line.'
    ]
  },
  whichLine: {
    title: 'Which line to compare',
    paragraphs: [
      'The solid one. It is the law at this N. The dashed limit leaves out a prefactor, and the Gaussian holds only near the mean: where they part from the solid line, the difference is not a finding.'
    ]
  },
  edge: {
    title: 'The hatched edge',
    paragraphs: [
      'Hoeffding’s bound: with this mean, no independent trials put more than that share of shots in the tail. It needs no fit. Counts surely above it rule independent trials out by themselves.'
    ]
  },
  chernoff: {
    title: 'Chernoff bounds',
    paragraphs: [
      'Simpler bounds on the same tails, exp(−N·I): from the best law (dashed), and from the mean alone (dotted), which holds for every law with that mean.'
    ]
  },
  overCeiling: {
    title: 'Variance over ceiling',
    paragraphs: [
      'Above 1 the counts scatter more than any independent trials can. Below 1 the trials differ, or the defects keep away from each other: the variance alone does not tell which.'
    ]
  },
  severalTests: {
    title: 'Allowing for several tests',
    paragraphs: [
      'Each test may cry wolf, so their p-values are raised together (Holm 1979). The answer uses the raised ones.'
    ]
  },
  compared: (tieWithin: number): MarginNote => ({
    title: 'How they are compared',
    paragraphs: [
      `Each story is fitted by likelihood. AIC takes 2 off for every number that was fitted, the mean among them. Two that lie less than ${tieWithin} apart cannot be told from each other. The weight is exp(−behind/2), as a share of the list: it says nothing of stories that are not in it.`
    ]
  }),
  ownNumber: {
    title: 'The interval of a number',
    paragraphs: [
      'The values at which the likelihood, fitted anew in everything else, lies at most 1.92 under its maximum.'
    ]
  },
  ownFit: {
    title: 'p of its fit',
    paragraphs: [
      'Histograms drawn from the story and fitted again: how often they lie as far from it as these counts. A story may lead the list and still not fit. A dash: not asked, since it lies too far behind.'
    ]
  },
  independentListed: {
    title: 'Independent trials in the list',
    paragraphs: [
      'They stand in it for comparison. The best law counts one number for each probability between 0 and 1, which favours it.'
    ]
  },
  twoSettings: {
    title: 'Two settings',
    paragraphs: [
      'Half of the shots at p(1 − d), half at p(1 + d): the shares are taken to be equal, and only d is fitted. Where one setting had fewer shots the story fits worse than it could, and bursts, which are the same law with a small share, or dead shots may lead in its place.'
    ]
  },
  /** @param drawn see sayDrawnFrom */
  origin: (drawn: string): MarginNote => ({
    title: 'Where a p-value comes from',
    paragraphs: [
      `Exact: by calculation. ${drawn} Permuted: the same shots in shuffled order. Limit law: for long lists of shots, the law that shuffling tends to. The smallest p that a test could have shown stands beside it.`
    ]
  }),
  again: {
    title: 'The same again',
    paragraphs: [
      'The same counts, options, seed and engine give the same document, byte for byte, on the page and on the command line; the same document gives this file, byte for byte.'
    ]
  },
  withoutCounts: {
    title: 'Without the counts',
    paragraphs: [
      'This report does not show the counts, nor shares of shots with their intervals, the charts drawn from them, sums such as likelihoods, seed and resamples, and sentences that name numbers of shots. Other numbers are rounded: p-values to two digits, intervals outward. That does not make the counts secret: who guesses them can check the guess against what is left.'
    ]
  },
  notIndependent: {
    title: 'Compatible, not independent',
    paragraphs: [
      'A pass is never a proof. Free fermions and particles that exclude their neighbours on an open line give counts that are exactly a sum of independent trials.'
    ]
  }
} satisfies Record<
  string,
  MarginNote | ((tieWithin: number) => MarginNote) | ((drawn: string) => MarginNote)
>;
