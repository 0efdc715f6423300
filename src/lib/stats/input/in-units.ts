import { BadInput, type Histogram, type Unit } from '../types';

/** What is tested: the histogram and N in the unit chosen. */
export interface InUnits {
  histogram: Histogram;
  trials: number | null;
}

/** For pairs, n/2 out of N/2; odd counts, an odd N or an odd lump are refused. Counts above N are refused. */
export function inUnits(histogram: Histogram, trials: number | null, unit: Unit): InUnits {
  const last = histogram.lump?.from ?? histogram.counts.at(-1)?.[0] ?? histogram.below!.to;
  if (trials !== null && last > trials) {
    throw new BadInput(`A count of ${last} was seen, more than the ${trials} trials allow.`);
  }
  if (unit === 'defect') return { histogram, trials };
  const odd = histogram.counts.find(([count]) => count % 2 === 1);
  if (odd) {
    throw new BadInput(
      `Counted in pairs every count must be even, but ${odd[1]} shots have count ${odd[0]}: misread sites, or not a ring.`
    );
  }
  if (trials !== null && trials % 2 === 1)
    throw new BadInput(`Counted in pairs the number of trials must be even, not ${trials}.`);
  const { lump } = histogram;
  if (lump && lump.from % 2 === 1)
    throw new BadInput('Counted in pairs the closing row must start at an even count.');
  const { below } = histogram;
  if (below && below.to % 2 === 1)
    throw new BadInput('Counted in pairs the opening row must end at an even count.');
  return {
    histogram: {
      kind: 'histogram',
      counts: histogram.counts.map(([count, shots]) => [count / 2, shots]),
      lump: lump && { from: lump.from / 2, shots: lump.shots },
      ...(below && { below: { to: below.to / 2, shots: below.shots } })
    },
    trials: trials === null ? null : trials / 2
  };
}
