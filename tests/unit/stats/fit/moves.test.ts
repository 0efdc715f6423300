import { climb } from '$lib/stats/fit/climb';
import { moves } from '$lib/stats/fit/moves';
import { workspace } from '$lib/stats/fit/workspace';
import { describe, expect, it } from 'vitest';
import { dataOf, levelsOf } from './plain';

describe('moves', () => {
  // The law of one sure trial and two at one half.
  const shots = [0, 2500, 5000, 2500];
  const space = () => workspace(dataOf({ shots, trials: 4 }));

  it('promise nothing at the maximum', () => {
    const best = levelsOf([[0.5, 2]], { ones: 1, zeros: 1 });
    expect(moves(space(), best, 1e-6)).toEqual([]);
  });

  it('see that equal levels want to split, and the split gains about what was promised', () => {
    const work = space();
    const equal = climb(work, levelsOf([[0.5, 4]]), 1e-12);
    const [first] = moves(work, equal.levels, 1e-3);
    expect(first.promise).toBeGreaterThan(100);
    const gains = first.starts.map((start) => climb(work, start, 1e-9).value - equal.value);
    expect(Math.max(...gains)).toBeGreaterThan(0.2 * first.promise);
  });

  it('see that a trial wants to leave 0, and one to leave 1', () => {
    // Binomial(3, ½) counts, fitted with one trial stuck at an end.
    const data = dataOf({ shots: [1250, 3750, 3750, 1250], trials: 3 });
    const work = workspace(data);
    const stuck = climb(work, levelsOf([[0.5, 2]], { zeros: 1 }), 1e-9);
    expect(stuck.value).toBe(-Infinity);
    const low = workspace(dataOf({ shots: [4000, 5000, 1000], trials: 3 }));
    const ofZero = climb(low, levelsOf([[0.35, 2]], { zeros: 1 }), 1e-9);
    const found = moves(low, ofZero.levels, 1e-3);
    const best = Math.max(
      ...found.flatMap(({ starts }) => starts.map((start) => climb(low, start, 1e-9).value))
    );
    expect(best).toBeGreaterThanOrEqual(ofZero.value);
    const high = workspace(dataOf({ shots: [0, 1000, 5000, 4000], trials: 4 }));
    const ofOne = climb(high, levelsOf([[0.65, 2]], { ones: 1, zeros: 1 }), 1e-9);
    for (const move of moves(high, ofOne.levels, 1e-3)) expect(move.promise).toBeGreaterThan(1e-3);
  });

  it('let a Poisson part harden into trials where the counts are regular', () => {
    const work = workspace(dataOf({ shots: [10, 200, 580, 200, 10], trials: null }));
    const rare = climb(work, levelsOf([], { zeros: Infinity, poissonPart: 2 }), 1e-9);
    const [first] = moves(work, rare.levels, 1e-3);
    expect(first.starts.some(({ p }) => p.length === 1)).toBe(true);
    const gain = Math.max(...first.starts.map((start) => climb(work, start, 1e-9).value)) - rare.value;
    expect(gain).toBeGreaterThan(100);
  });
});
