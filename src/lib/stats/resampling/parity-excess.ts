import { evenProbability } from './even-probability';
import type { Refitted } from './refitted';

/** |shots with even count − S·P(even)| in its own standard deviations; 0 when the law leaves no choice. */
export function parityExcess({ data, law }: Refitted): number {
  let even = 0;
  for (let i = 0; i < data.shots.length; i++) if ((data.first + i) % 2 === 0) even += data.shots[i];
  const p = evenProbability(law);
  const spread = Math.sqrt(data.total * p * (1 - p));
  return spread > 0 ? Math.abs(even - data.total * p) / spread : 0;
}
