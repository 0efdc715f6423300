import type { FitData } from '../fit/fit-data';
import { familyEven } from './fitted-law';
import type { Refitted } from './refitted';

/** |shots with even count − S·P(even)| in its own standard deviations; 0 when the law leaves no choice. */
export function parityExcess({ data, law }: Refitted): number {
  const even = evenShots(data);
  const p = familyEven(law);
  const spread = Math.sqrt(data.total * p * (1 - p));
  return spread > 0 ? Math.abs(even - data.total * p) / spread : 0;
}

/**
 * G² that a law must leave of these counts for parityExcess to reach `z`: with q the share of even shots and p their
 * probability, G² ≥ 2S·KL(q‖p) ≥ 4S(q − p)² (Pinsker), and z² = S(q − p)²/(p(1 − p)) is reached at the least distance
 * d = |q − p| on the side where p(1 − p) is smaller, (S + z²)d² + z²|1 − 2q|d = z²q(1 − q); there G² ≥ 4S·d².
 */
export function parityNeeds(data: FitData, z: number): number {
  if (!(z > 0)) return 0;
  const { total } = data;
  const q = evenShots(data) / total;
  const square = z * z;
  const lean = square * Math.abs(1 - 2 * q);
  const d =
    (Math.sqrt(lean * lean + 4 * (total + square) * square * q * (1 - q)) - lean) / (2 * (total + square));
  return 4 * total * d * d;
}

function evenShots(data: FitData): number {
  let even = 0;
  for (let i = 0; i < data.shots.length; i++) if ((data.first + i) % 2 === 0) even += data.shots[i];
  return even;
}
