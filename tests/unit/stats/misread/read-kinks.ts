import { generator } from '$lib/stats/random/generator';
import type { Histogram } from '$lib/stats/types';

/** Shots of independent kinks along a chain of spins, each spin then misread or not: nothing of the law is used. */
export function readKinks(seed: number, bonds: number, p: number, rate: number, shots: number): Histogram {
  const random = generator(seed, 0);
  const seen = new Map<number, number>();
  for (let shot = 0; shot < shots; shot++) {
    let spin = false;
    let read = random.next() < rate;
    let count = 0;
    for (let bond = 0; bond < bonds; bond++) {
      if (random.next() < p) spin = !spin;
      const next = random.next() < rate ? !spin : spin;
      if (next !== read) count++;
      read = next;
    }
    seen.set(count, (seen.get(count) ?? 0) + 1);
  }
  return { kind: 'histogram', counts: [...seen].sort((a, b) => a[0] - b[0]), lump: null };
}
