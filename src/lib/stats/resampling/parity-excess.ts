import { evenProbability } from './even-probability';
import type { FitData } from '../fit/fit-data';
import type { Refitted } from './refitted';

/** |shots with even count − S·P(even)| in its own standard deviations; 0 when the law leaves no choice. */
export function parityExcess({ data, law }: Refitted): number {
  const even = evenShots(data);
  const p = evenProbability(law);
  const spread = Math.sqrt(data.total * p * (1 - p));
  return spread > 0 ? Math.abs(even - data.total * p) / spread : 0;
}

/**
 * Largest parityExcess under any law whose G² for these counts is at most `gSquared`: with q the share of even shots,
 * 2S·KL(q‖p) ≤ G² and KL ≥ 2(q − p)² (Pinsker), so |q − p| ≤ √(G²/4S) =: d, and z² ≤ S·d²/(p(1 − p)) at the worst such p.
 */
export function mostParityExcess(data: FitData, gSquared: number): number {
  const q = evenShots(data) / data.total;
  const d = Math.sqrt(gSquared / (4 * data.total));
  const low = q - d;
  const high = q + d;
  if (low <= 0 || high >= 1) return Infinity;
  return d * Math.sqrt(data.total / Math.min(low * (1 - low), high * (1 - high)));
}

function evenShots(data: FitData): number {
  let even = 0;
  for (let i = 0; i < data.shots.length; i++) if ((data.first + i) % 2 === 0) even += data.shots[i];
  return even;
}
