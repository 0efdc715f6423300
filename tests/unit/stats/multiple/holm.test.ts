import { holm } from '$lib/stats/multiple/holm';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';

// The 15 p-values of Benjamini & Hochberg 1995, J. R. Statist. Soc. B 57:289, section 4.1.
const EXAMPLE = [
  0.0001, 0.0004, 0.0019, 0.0095, 0.0201, 0.0278, 0.0298, 0.0344, 0.0459, 0.324, 0.4262, 0.5719, 0.6528,
  0.759, 1
];

describe('holm', () => {
  it('keeps 3 of the 15 at 5 %', () => {
    expect(holm(EXAMPLE).filter((p) => p <= 0.05).length).toBe(3);
  });

  it('agrees with R', () => {
    // R 4.2.2: p.adjust(p, "holm")
    const expected = [0.0015, 0.0056, 0.0247, 0.114, 0.2211, 0.278, 0.278, 0.278, 0.3213, 1, 1, 1, 1, 1, 1];
    holm(EXAMPLE).forEach((p, i) => expect(p).toBeCloseTo(expected[i], 12));
    // R 4.2.2: p.adjust(c(.04,.01,.03,.01,.9), "holm")
    [0.09, 0.05, 0.09, 0.05, 0.9].forEach((p, i) =>
      expect(holm([0.04, 0.01, 0.03, 0.01, 0.9])[i]).toBeCloseTo(p, 12)
    );
  });

  it('lies between the p-value and Bonferroni, keeps order, and does not mind the order given', () => {
    fc.assert(
      fc.property(fc.array(fc.double({ min: 0, max: 1, noNaN: true }), { maxLength: 12 }), (p) => {
        const adjusted = holm(p);
        const backwards = holm([...p].reverse()).reverse();
        p.forEach((value, i) => {
          expect(adjusted[i]).toBeGreaterThanOrEqual(value);
          expect(adjusted[i]).toBeLessThanOrEqual(Math.min(1, p.length * value));
          expect(adjusted[i]).toBe(backwards[i]);
          p.forEach((other, j) => expect(value <= other && adjusted[i] > adjusted[j]).toBe(false));
        });
      })
    );
  });

  it('takes nothing and refuses what is no p-value', () => {
    expect(holm([])).toEqual([]);
    for (const bad of [-0.1, 1.1, NaN]) expect(() => holm([0.5, bad])).toThrow(RangeError);
  });
});
