/**
 * Number of runs above and not above a cut: 1 more than the places where neighbouring shots lie on different sides.
 * Few runs mean drift or persistence, many mean alternation.
 *
 * @param shots counts in the order taken
 * @param cut see `runsCut`; above is a count > cut
 * @returns 0 without shots
 *
 * Source: Wald & Wolfowitz 1940, Ann. Math. Statist. 11:147.
 */
export function runsCount(shots: ArrayLike<number>, cut: number): number {
  let runs = shots.length > 0 ? 1 : 0;
  for (let i = 1; i < shots.length; i++) if (shots[i] > cut !== shots[i - 1] > cut) runs++;
  return runs;
}
