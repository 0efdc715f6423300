/**
 * G statistic of a 2 × K table of shots, 2·Σ O ln(O/E) over both rows, E = row total × column total / all; in nats,
 * close to chi-square with K − 1 degrees of freedom when every E is large and both rows come from one law.
 *
 * @param first, second shots of the two rows, cell by cell; cells empty in both add nothing
 * @returns ≥ 0; 0 when the rows are in proportion
 *
 * Source: Sokal & Rohlf, Biometry, ch. 17 (m); Wilks 1935, Ann. Math. Statist. 6:190 (m).
 */
export function gStatistic(first: ArrayLike<number>, second: ArrayLike<number>): number {
  let a = 0;
  let b = 0;
  for (let i = 0; i < first.length; i++) {
    a += first[i];
    b += second[i];
  }
  const shareA = a / (a + b);
  const shareB = b / (a + b);
  let sum = 0;
  for (let i = 0; i < first.length; i++) {
    const column = first[i] + second[i];
    if (first[i] > 0) sum += first[i] * Math.log(first[i] / (column * shareA));
    if (second[i] > 0) sum += second[i] * Math.log(second[i] / (column * shareB));
  }
  return Math.max(0, 2 * sum);
}
