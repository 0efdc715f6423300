import { formatCount, formatNumber, formatPercent } from '../words/format-number';
import { sayHowOften } from '../words/say-p';
import type { FoundChance } from './pair-power';
import type { MappedPair, SitesReport } from './sites-types';

type Found = Omit<SitesReport, 'statement' | 'because' | 'cautions'>;

/** Pairs named one by one. */
const most = 10;

/** The answer of a map of sites in words: the pairs found, why, and what the shots cannot tell. */
export function sitesWords(map: Found): Pick<SitesReport, 'statement' | 'because' | 'cautions'> {
  const found = map.pairs.filter(({ pHolm }) => pHolm <= map.alpha).sort((a, b) => a.pHolm - b.pHolm);
  return {
    statement: statementOf(map, found),
    because: becauseOf(map, found),
    cautions: cautionsOf(map, found)
  };
}

const nameOf = ({ names }: Found, { first, second }: MappedPair) => `${names[first]} and ${names[second]}`;

function statementOf(map: Found, found: MappedPair[]): string {
  const all = formatCount(map.pairs.length);
  if (map.common.shown && found.length !== 1) {
    const { pairs, mean } = map.common;
    const what =
      (mean ?? 0) > 0
        ? 'All sites move together'
        : 'Sites avoid each other on the whole, by repulsion or because shots were selected by their total';
    return `${what}: the mean correlation of ${formatCount(pairs)} distant pairs is ${formatNumber(mean, 2)}. Single pairs cannot be read one by one.`;
  }
  if (found.length === 0)
    return `No pair of ${all} is correlated by more than chance allows; a neighbouring pair with correlation ${map.power.correlation} would be found with a chance of ${formatPercent(map.power.neighbour.power)}.`;
  if (found.length === 1)
    return `One pair of ${all} is correlated by more than chance allows: sites ${nameOf(map, found[0])}, correlation ${sayCorrelation(found[0])}.`;
  return `${formatCount(found.length)} pairs of ${all} are correlated by more than chance allows; the clearest are sites ${nameOf(map, found[0])}.`;
}

function sayCorrelation({ correlation, low, high }: MappedPair): string {
  return `${formatNumber(correlation, 2)} (${formatNumber(low, 2)} to ${formatNumber(high, 2)})`;
}

function becauseOf(map: Found, found: MappedPair[]): string[] {
  const lines = found
    .slice(0, most)
    .map(
      (pair) =>
        `Sites ${nameOf(map, pair)}, ${pair.distance === 1 ? 'neighbours' : `${pair.distance} apart`}: correlation ${sayCorrelation(pair)}; with all pairs allowed for, ${sayHowOften(pair.pHolm)} (p = ${formatNumber(pair.pHolm, 2)}, Fisher’s exact test, Holm).`
    );
  if (found.length > most) lines.push(`And ${formatCount(found.length - most)} more pairs.`);
  lines.push(map.inCounts.statement);
  return lines;
}

function cautionsOf({ common, power, seek, shots, names }: Found, found: MappedPair[]): string[] {
  const lines: string[] = [];
  if (common.shown)
    lines.push(
      `${formatPercent(common.positive)} of the distant pairs have a correlation above 0, with a mean of ${formatNumber(common.mean, 2)} (p = ${formatNumber(common.p, 2)}): ${
        (common.mean ?? 0) > 0
          ? 'a common cause, such as drifting rates or dead shots, moves all sites'
          : 'sites repel each other at every distance, or shots were kept or dropped by how many sites were excited'
      }. Find it before any pair is read by itself.`
    );
  const { neighbour, distant } = power;
  const each = (name: string, { power: chance, shots: needed }: FoundChance) =>
    `${name} with a chance of about ${formatPercent(chance)}${needed === null ? '' : ` (80\u202f% from ${formatCount(needed)} shots on)`}`;
  lines.push(
    `Among ${names.length} sites of this rate, ${formatCount(shots)} shots find one pair with correlation ${power.correlation}: ${each('neighbours', neighbour)}${distant ? `, ${each('a distant pair', distant)}` : ''}. A pair that is not found may be there.`
  );
  if (distant !== null || seek === 'rise')
    lines.push(
      seek === 'rise'
        ? 'Only a rise was looked for, neighbours before all others: this has to be declared before the data are seen. Sites that repel each other are not found in this way.'
        : 'Neighbours have half of the allowed error, all other pairs the other half.'
    );
  if (found.length > 0)
    lines.push(
      'A correlation does not say which of the two sites acts on the other, nor whether a third acts on both.'
    );
  return lines;
}
