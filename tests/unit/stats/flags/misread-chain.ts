/**
 * Exact law of the kinks read on an open chain: independent kinks with probability p on each of `bonds` bonds, each of
 * the bonds + 1 sites misread with probability `flips`. Steps along the chain with the flip of the last site as state.
 */
export function openBonds(bonds: number, p: number, flips: number): number[] {
  let state = [[1 - flips], [flips]];
  for (let bond = 0; bond < bonds; bond++) {
    const next = [new Array<number>(bond + 2).fill(0), new Array<number>(bond + 2).fill(0)];
    for (const before of [0, 1]) {
      for (const after of [0, 1]) {
        const seen = before === after ? p : 1 - p;
        const weight = after ? flips : 1 - flips;
        state[before].forEach((f, n) => {
          next[after][n] += f * weight * (1 - seen);
          next[after][n + 1] += f * weight * seen;
        });
      }
    }
    state = next;
  }
  return state[0].map((f, n) => f + state[1][n]);
}
