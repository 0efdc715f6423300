import { describe, expect, it } from 'vitest';
import { cellWeights } from '$lib/stats/fit/cell-weights';
import { fitData } from '$lib/stats/fit/fit-data';
import { levelRemoval } from '$lib/stats/fit/level-removal';
import { logLikelihood } from '$lib/stats/fit/log-likelihood';
import { removeTrial } from '$lib/stats/fit/remove-trial';
import { workspace } from '$lib/stats/fit/workspace';

const counts: [number, number][] = [
  [3, 5],
  [4, 40],
  [6, 80],
  [7, 21],
  [9, 2]
];

/** Two levels on either side of ½; removeTrial and a plain sum are the other way to the same numbers. */
const levels = { p: [0.8, 0.2], trials: [6, 9], ones: 0, zeros: 1, poissonPart: 0 };

describe('levelRemoval', () => {
  for (const [name, lump, withoutEmpty] of [
    ['a plain histogram', null, false],
    ['a closing lump', { from: 10, shots: 4 }, false],
    ['empty shots set aside', null, true]
  ] as const) {
    for (const [j, p] of levels.p.entries()) {
      it(`agrees with two removals and their sums: ${name}, p = ${p}`, () => {
        const data = fitData({ kind: 'histogram', counts, lump }, 16, withoutEmpty);
        const space = workspace(data);
        logLikelihood(space, levels);
        cellWeights(space);
        const one = new Float64Array(space.length);
        const two = new Float64Array(space.length);
        removeTrial(space.f, space.length, levels.p[j], one);
        removeTrial(one, space.length, levels.p[j], two);
        const sum = (g: Float64Array) => g.reduce((total, value, k) => total + space.bent[k] * value, 0);

        const sums = { single: 0, double: 0 };
        levelRemoval(space, levels.p[j], true, sums);
        expect(sums.single / sum(one)).toBeCloseTo(1, 10);
        expect(sums.double / sum(two)).toBeCloseTo(1, 10);
        // g is right wherever a seen count, or the one before it, asks for it.
        for (const [count] of counts) {
          const k = count - space.first;
          expect(space.g[k]).toBeCloseTo(one[k], 14);
          expect(space.g[k - 1]).toBeCloseTo(one[k - 1], 14);
        }
        levelRemoval(space, levels.p[j], false, sums);
        expect(sums.double).toBe(0);
      });
    }
  }
});
