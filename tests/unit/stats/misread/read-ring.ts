import { generator, type Generator } from '$lib/stats/random/generator';
import type { Histogram } from '$lib/stats/types';

/**
 * Shots of independent kinks round a ring of spins, each spin then misread or not: bonds are drawn until an even number
 * holds a kink, spins follow, and the readings of neighbours are compared. Nothing of the law is used.
 */
export function readRing(seed: number, bonds: number, p: number, rate: number, shots: number): Histogram {
  const random = generator(seed, 0);
  const seen = new Map<number, number>();
  for (let shot = 0; shot < shots; shot++) {
    const count = readOnce(random, bonds, p, rate);
    seen.set(count, (seen.get(count) ?? 0) + 1);
  }
  return { kind: 'histogram', counts: [...seen].sort((a, b) => a[0] - b[0]), lump: null };
}

function readOnce(random: Generator, bonds: number, p: number, rate: number): number {
  for (;;) {
    const spins = [false];
    for (let bond = 1; bond <= bonds; bond++)
      spins.push(random.next() < p ? !spins[bond - 1] : spins[bond - 1]);
    // The last bond leads back to the first spin.
    if (spins[bonds] !== spins[0]) continue;
    const read = spins.slice(0, bonds).map((spin) => (random.next() < rate ? !spin : spin));
    return read.filter((spin, k) => spin !== read[(k + 1) % bonds]).length;
  }
}
