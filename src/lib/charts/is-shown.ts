import type { DistributionPoint } from '$lib/stats/types';

/** Worth drawing and counting: seen, or expected at least a twentieth of a shot by the best law. */
export const isShown = (point: DistributionPoint, shots: number): boolean =>
  point.shots > 0 || point.fitted * shots > 0.05;
