import { cellChange } from '$lib/stats/fit/cell-change';
import { information, weigh } from '$lib/stats/fit/cell-sums';
import { cellWeights } from '$lib/stats/fit/cell-weights';
import { logLikelihood } from '$lib/stats/fit/log-likelihood';
import { workspace } from '$lib/stats/fit/workspace';
import { describe, expect, it } from 'vitest';
import { dataOf, levelsOf, plainPmf, probabilities, type Problem } from './plain';

const levels = levelsOf(
  [
    [0.3, 3],
    [0.6, 1]
  ],
  { ones: 1, zeros: 1 }
);
const f = plainPmf(probabilities(levels));
const at = (n: number) => f[n] ?? 0;

/** (u^power f)_n by its definition; power −1 is f_{n+1} − f_n. */
function changeAt(n: number, power: 1 | 2 | -1): number {
  if (power === 1) return at(n - 1) - at(n);
  return power === 2 ? at(n - 2) - 2 * at(n - 1) + at(n) : at(n + 1) - at(n);
}

describe.each([1, 2, -1] as const)('cellChange, power %s', (power) => {
  it('is the difference of neighbouring probabilities in each cell, and its sum in the lump', () => {
    const problem: Problem = { shots: [0, 4, 9, 3], trials: 6, lump: { from: 4, shots: 5 } };
    const space = workspace(dataOf(problem));
    logLikelihood(space, levels);
    cellWeights(space);
    const out = new Float64Array(space.data.shots.length + 3);
    cellChange(space, space.f, power, out);
    for (let n = 1; n <= 3; n++) expect(out[n - 1]).toBeCloseTo(changeAt(n, power), 13);
    let lump = 0;
    for (let n = 4; n <= 8; n++) lump += changeAt(n, power);
    expect(out[3]).toBeCloseTo(lump, 13);
  });

  it('sums over an opening row', () => {
    const problem: Problem = { shots: [0, 0, 0, 9, 3], trials: 6, below: { to: 2, shots: 11 } };
    const space = workspace(dataOf(problem));
    logLikelihood(space, levels);
    cellWeights(space);
    const out = new Float64Array(space.data.shots.length + 3);
    cellChange(space, space.f, power, out);
    let below = 0;
    for (let n = -1; n <= 2; n++) below += changeAt(n, power);
    expect(out[4]).toBeCloseTo(below, 13);
  });

  it('takes in the empty cell when empty shots are set aside', () => {
    const space = workspace(dataOf({ shots: [7, 4, 9, 3], trials: 6, withoutEmpty: true }));
    logLikelihood(space, levels);
    cellWeights(space);
    const out = new Float64Array(space.data.shots.length + 3);
    cellChange(space, space.f, power, out);
    // One sure trial: f_0 is 0, and grows only when that trial leaves 1.
    expect(out[4]).toBeCloseTo(changeAt(0, power), 13);
  });
});

describe('cell weights and sums', () => {
  it('are h/f, h/f² and their sums over the cells', () => {
    const shots = [0, 4, 9, 3];
    const space = workspace(dataOf({ shots, trials: 6 }));
    logLikelihood(space, levels);
    cellWeights(space);
    const change = Float64Array.from([0.1, -0.2, 0.4, 0, 0, 0]);
    let single = 0;
    let double = 0;
    shots.slice(1).forEach((h, i) => {
      single += (h / f[i + 1]) * change[i];
      double += (h / f[i + 1] ** 2) * change[i] ** 2;
    });
    expect(weigh(space, change)).toBeCloseTo(single, 9);
    expect(information(space, change, change)).toBeCloseTo(double, 9);
  });
});
