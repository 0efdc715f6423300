import { BadInput, type Geometry, type Unit } from '../stats/types';

/** What is counted, as a sentence names it. */
const COUNTED: Record<Geometry, string> = {
  sites: 'excited sites',
  'open-bonds': 'kinks of an open chain',
  'ring-bonds': 'kinks round a ring'
};

/**
 * Refuses datasets whose cumulants do not belong on one axis: counted in another unit, of another geometry, or out of
 * another number of trials where both are known, since every cumulant grows with that number.
 *
 * @throws BadInput with the names of the first two that differ
 */
export function refuseUnlike(
  chosen: { name: string; unit: Unit; geometry: Geometry; trials: number | null }[]
): void {
  const [first] = chosen;
  const unit = chosen.find((one) => one.unit !== first.unit);
  if (unit)
    throw new BadInput(
      `“${first.name}” is counted in ${first.unit}s and “${unit.name}” in ${unit.unit}s: choose datasets of one unit.`
    );
  const geometry = chosen.find((one) => one.geometry !== first.geometry);
  if (geometry)
    throw new BadInput(
      `“${first.name}” counts ${COUNTED[first.geometry]} and “${geometry.name}” ${COUNTED[geometry.geometry]}: choose datasets of one geometry.`
    );
  const known = chosen.filter(({ trials }) => trials !== null);
  const trials = known.find((one) => one.trials !== known[0].trials);
  if (trials)
    throw new BadInput(
      `“${known[0].name}” has N = ${known[0].trials} and “${trials.name}” N = ${trials.trials}: every cumulant grows with N, so a power law of both would tell their sizes. Choose datasets of one N.`
    );
}
