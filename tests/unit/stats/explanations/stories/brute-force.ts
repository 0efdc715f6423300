/** Laws of counts by going through every case, for N ≤ 8: written from the story, not from its pmf. */

/** Sum over all 2^N patterns of sites with the chance of each. */
export function overPatterns(sites: number, chance: (pattern: boolean[]) => number): number[] {
  const pmf = new Array<number>(sites + 1).fill(0);
  for (let word = 0; word < 2 ** sites; word++) {
    const pattern = Array.from({ length: sites }, (_, i) => (word & (1 << i)) !== 0);
    pmf[pattern.filter(Boolean).length] += chance(pattern);
  }
  return pmf;
}

/** Markov chain with stationary probability p and neighbour correlation c. */
export const chain = (sites: number, p: number, c: number): number[] =>
  overPatterns(sites, (pattern) => {
    let weight = pattern[0] ? p : 1 - p;
    for (let i = 1; i < sites; i++) {
      // P(1 after 1) − P(1 after 0) = c with the same p at each site.
      const one = pattern[i - 1] ? p + c * (1 - p) : p - c * p;
      weight *= pattern[i] ? one : 1 - one;
    }
    return weight;
  });

/** Spins made from kinks, spins flipped, kinks read again. */
export function misreadChain(bonds: number, p: number, flip: number): number[] {
  const pmf = new Array<number>(bonds + 1).fill(0);
  for (let kinks = 0; kinks < 2 ** bonds; kinks++) {
    for (let flips = 0; flips < 2 ** (bonds + 1); flips++) {
      let [weight, spin, read, before] = [1, false, 0, false];
      for (let site = 0; site <= bonds; site++) {
        if (site > 0) {
          const kink = (kinks & (1 << (site - 1))) !== 0;
          weight *= kink ? p : 1 - p;
          if (kink) spin = !spin;
        }
        const wrong = (flips & (1 << site)) !== 0;
        weight *= wrong ? flip : 1 - flip;
        const shown = wrong ? !spin : spin;
        if (site > 0 && shown !== before) read++;
        before = shown;
      }
      pmf[read] += weight;
    }
  }
  return pmf;
}

const choose = (n: number, k: number): number => {
  let value = 1;
  for (let i = 1; i <= k; i++) value = (value * (n - k + i)) / i;
  return value;
};

export const binomial = (n: number, p: number): number[] =>
  Array.from({ length: n + 1 }, (_, k) => choose(n, k) * p ** k * (1 - p) ** (n - k));

/** Pairs struck out one after the other. */
export function losingPairs(sites: number, p: number, loss: number): number[] {
  const pmf = new Array<number>(sites + 1).fill(0);
  const go = (count: number, pairs: number, weight: number): void => {
    if (pairs === 0) pmf[count] += weight;
    else {
      go(count - 2, pairs - 1, weight * loss);
      go(count, pairs - 1, weight * (1 - loss));
    }
  };
  binomial(sites, p).forEach((weight, formed) => go(formed, Math.floor(formed / 2), weight));
  return pmf;
}

/** ∫ Bin(N, x) beta(x) dx by rising factorials: C(N,n) Π(p+ρ'i)Π(q+ρ'j)/Π(1+ρ'k), ρ' = ρ/(1−ρ). */
export function polya(sites: number, p: number, rho: number): number[] {
  const step = rho / (1 - rho);
  const rising = (from: number, times: number) => {
    let product = 1;
    for (let i = 0; i < times; i++) product *= from + step * i;
    return product;
  };
  return Array.from(
    { length: sites + 1 },
    (_, n) => (choose(sites, n) * rising(p, n) * rising(1 - p, sites - n)) / rising(1, sites)
  );
}
