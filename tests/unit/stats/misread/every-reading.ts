/**
 * Counts of every chain and every reading, weighed one by one: kinks of each bond, flips of each site. The counting
 * stands in for the stepping of the engine; nothing of ours is used.
 *
 * @param p kink probability of each bond in order
 * @param ring true: bond k joins site k to site k + 1 mod N, and only even numbers of kinks are taken, weights divided by their sum
 */
export function everyReading(p: number[], rate: number, ring = false): number[] {
  const bonds = p.length;
  const sites = ring ? bonds : bonds + 1;
  const out = new Array<number>(bonds + 1).fill(0);
  let taken = 0;
  for (let kinks = 0; kinks < 1 << bonds; kinks++) {
    let weight = 1;
    let number = 0;
    for (let k = 0; k < bonds; k++) {
      weight *= (kinks >> k) & 1 ? p[k] : 1 - p[k];
      number += (kinks >> k) & 1;
    }
    if (ring && number % 2 === 1) continue;
    taken += weight;
    for (let flips = 0; flips < 1 << sites; flips++) {
      let chance = weight;
      for (let s = 0; s < sites; s++) chance *= (flips >> s) & 1 ? rate : 1 - rate;
      let read = 0;
      for (let k = 0; k < bonds; k++) {
        read += ((kinks >> k) & 1) ^ ((flips >> k) & 1) ^ ((flips >> ((k + 1) % sites)) & 1);
      }
      out[read] += chance;
    }
  }
  return out.map((f) => f / taken);
}

/** Mean and variance of a pmf that starts at 0. */
export function momentsOf(pmf: ArrayLike<number>): { mean: number; variance: number } {
  let mean = 0;
  for (let n = 0; n < pmf.length; n++) mean += n * pmf[n];
  let variance = 0;
  for (let n = 0; n < pmf.length; n++) variance += (n - mean) ** 2 * pmf[n];
  return { mean, variance };
}
