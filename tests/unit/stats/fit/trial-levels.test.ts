import { copyLevels, toLaw } from '$lib/stats/fit/trial-levels';
import { describe, expect, it } from 'vitest';
import { levelsOf } from './plain';

describe('toLaw', () => {
  it('sorts the levels from high to low, sure trials first and impossible ones last', () => {
    const levels = levelsOf(
      [
        [0.2, 3],
        [0.7, 1]
      ],
      { ones: 2, zeros: 5 }
    );
    expect(toLaw(levels)).toEqual({
      levels: [
        { p: 1, trials: 2 },
        { p: 0.7, trials: 1 },
        { p: 0.2, trials: 3 },
        { p: 0, trials: 5 }
      ],
      poissonPart: 0
    });
  });

  it('names no impossible trials when N is unknown: an infinity is no number of a document', () => {
    const levels = levelsOf([[0.2, 3]], { zeros: Infinity, poissonPart: 0.5 });
    expect(toLaw(levels)).toEqual({ levels: [{ p: 0.2, trials: 3 }], poissonPart: 0.5 });
  });
});

describe('copyLevels', () => {
  it('can be changed without changing the original', () => {
    const levels = levelsOf([[0.2, 3]], { ones: 1 });
    const copy = copyLevels(levels);
    copy.p[0] = 0.9;
    copy.trials[0] = 1;
    copy.ones = 4;
    expect(levels).toEqual(levelsOf([[0.2, 3]], { ones: 1 }));
  });
});
