import { spreadLaw } from '$lib/stats/fit/spread-law';
import { toLaw, type TrialLevels } from '$lib/stats/fit/trial-levels';
import { workspace } from '$lib/stats/fit/workspace';
import { lawWindow } from '$lib/stats/laws/law-window';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { innerProbability } from '../laws/enumerate';
import { dataOf, levelsOf } from './plain';

const anyLevels = fc
  .record({
    rows: fc.array(fc.tuple(innerProbability, fc.integer({ min: 1, max: 60 })), { maxLength: 5 }),
    ones: fc.nat(4),
    zeros: fc.nat(4),
    poissonPart: fc.oneof(fc.constant(0), fc.double({ min: 1e-6, max: 40, noNaN: true }))
  })
  .map(({ rows, ...rest }) => levelsOf(rows, rest));

describe('spreadLaw', () => {
  it.each([0, 1e-20])('fills the workspace with what lawWindow gives, trim %s', (trim) => {
    const space = workspace(dataOf({ shots: [1, 1], trials: null }));
    fc.assert(
      fc.property(anyLevels, (levels: TrialLevels) => {
        spreadLaw(space, levels, trim);
        const window = lawWindow(toLaw(levels));
        let total = 0;
        for (let k = 0; k < space.length; k++) {
          total += space.f[k];
          const want = window.values[space.first + k - window.first] / window.scale;
          // A trimmed window lacks the paths through what was trimmed, parts of 1e-20.
          const lacking = trim === 0 ? 1e-305 : 1e-18;
          expect(Math.abs(space.f[k] - want)).toBeLessThan(1e-12 * want + lacking);
        }
        expect(total).toBeCloseTo(1, 12);
      }),
      { numRuns: 150 }
    );
  });

  it('keeps 1e-300 when nothing is trimmed', () => {
    const space = workspace(dataOf({ shots: [1, 1], trials: null }));
    const levels = levelsOf([[1e-3, 95]], { zeros: 0 });
    spreadLaw(space, levels, 0);
    const window = lawWindow(toLaw(levels));
    expect(space.length).toBe(96);
    expect(space.f[95] / (window.values[95] / window.scale)).toBeCloseTo(1, 11);
    expect(space.f[95]).toBeLessThan(1e-284);
  });
});
