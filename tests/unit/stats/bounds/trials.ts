/** pmf of a sum of independent trials by adding them one at a time: brute force for the tests here. */
export function addTrials(p: number[]): number[] {
  let pmf = [1];
  for (const q of p) {
    const next = new Array<number>(pmf.length + 1).fill(0);
    pmf.forEach((f, n) => {
      next[n] += f * (1 - q);
      next[n + 1] += f * q;
    });
    pmf = next;
  }
  return pmf;
}
