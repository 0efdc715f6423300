import { engineVersion } from '../engine-version';
import { formatCount, formatNumber, formatPercent } from '../words/format-number';
import { changePower, type ChangePower } from './change-power';
import { compareMaps, type ChangedPair, type MapsCompared } from './compare-maps';
import type { SitesReport } from './sites-types';

/** Two maps of the same sites side by side, as one plain document. */
export interface MapsComparedReport extends MapsCompared {
  format: 'severalty.sites-compared/1';
  engineVersion: string;
  geometry: SitesReport['geometry'];
  names: string[];
  /** Of the earlier map and of the later. */
  shots: [number, number];
  power: ChangePower;
  statement: string;
  because: string[];
  cautions: string[];
}

/** Change of correlation that the power is told for. */
const told = 0.05;

/** Pairs named one by one. */
const most = 10;

/**
 * Which pairs changed from one map to another (compareMaps), with the answer in words and what a change would have needed
 * to be found.
 *
 * @throws BadInput for maps of other sites, or of another geometry
 */
export function mapsCompared(earlier: SitesReport, later: SitesReport): MapsComparedReport {
  const compared = compareMaps(earlier, later);
  const { alpha, seek, common, pairs } = compared;
  const { names, geometry } = later;
  const shots: [number, number] = [earlier.shots, later.shots];
  const power = changePower(told, { sites: names.length, shots, geometry, alpha, seek });
  const changed = pairs.filter(({ pHolm }) => pHolm <= alpha).sort((a, b) => a.pHolm - b.pHolm);
  const nameOf = ({ first, second }: ChangedPair) => `${names[first]} and ${names[second]}`;
  const all = formatCount(pairs.length);
  const statement = common
    ? 'All sites of at least one of the maps move together, or avoid each other: changes of single pairs cannot be read one by one.'
    : changed.length === 0
      ? `No pair of ${all} changed by more than chance allows; neighbours whose correlation changed by ${told} would be found with a chance of about ${formatPercent(power.power)}.`
      : changed.length === 1
        ? `One pair of ${all} changed by more than chance allows: sites ${nameOf(changed[0])}, correlation ${sayChange(changed[0])}.`
        : `${formatCount(changed.length)} pairs of ${all} changed by more than chance allows; the clearest are sites ${nameOf(changed[0])}.`;
  const because = changed
    .slice(0, most)
    .map(
      (pair) =>
        `Sites ${nameOf(pair)}, ${pair.distance === 1 ? 'neighbours' : `${pair.distance} apart`}: correlation ${sayChange(pair)} (p = ${formatNumber(pair.pHolm, 2)} with all pairs allowed for, exact test of one odds ratio, Holm).`
    );
  if (changed.length > most) because.push(`And ${formatCount(changed.length - most)} more pairs.`);
  const cautions = [
    `Shots of ${formatCount(shots[0])} and ${formatCount(shots[1])} find neighbours whose correlation changed by ${told} with a chance of about ${formatPercent(power.power)}; 80\u202f% takes about ${formatCount(power.shots)} in each map, more where excitations are rare. A pair that changed may not be found.`,
    'A pair found in one map and not in the other has not for that alone changed: only this test of the difference says so.',
    seek === 'rise'
      ? 'Only a rise was looked for, as both maps declared beforehand.'
      : 'A rise and a fall were looked for alike.',
    'Firmware is not all that may differ between two maps: so may the day, the calibration and the rates of the sites.'
  ];
  return {
    format: 'severalty.sites-compared/1',
    engineVersion,
    geometry,
    names,
    shots,
    ...compared,
    power,
    statement,
    because,
    cautions
  };
}

const sayChange = ({ earlier, later }: ChangedPair): string =>
  `${formatNumber(earlier, 2)} before, ${formatNumber(later, 2)} after`;
