import type { TimelinePoint } from '$lib/model/team/devices/timeline';

export type Quantity = 'dispersion' | 'mean' | 'divergence';

interface Known {
  value: number;
  low: number;
  high: number;
  limits: [number, number] | null;
}

export const QUANTITIES = {
  dispersion: 'variance over ceiling',
  mean: 'mean count',
  divergence: 'divergence, nats a shot'
} as const satisfies Record<Quantity, string>;

/** A quantity of one version with its 95 % interval and the limits of the reference; null where it is not known. */
export function knownOf(
  { limits, divergenceLimit, ...point }: TimelinePoint,
  quantity: Quantity
): Known | null {
  const told = point[quantity];
  if (!told || told.value === null) return null;
  const { value } = told;
  const ends = { value, low: told.low ?? value, high: told.high ?? value };
  // A divergence has no lower limit: under it there is only less to be seen.
  if (quantity === 'divergence')
    return { ...ends, limits: divergenceLimit === null ? null : [0, divergenceLimit] };
  return { ...ends, limits: limits?.[quantity] ?? null };
}
