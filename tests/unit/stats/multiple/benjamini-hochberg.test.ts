import { benjaminiHochberg } from '$lib/stats/multiple/benjamini-hochberg';
import { describe, expect, it } from 'vitest';

describe('benjaminiHochberg', () => {
  // The 15 p-values of Benjamini & Hochberg 1995, J. R. Statist. Soc. B 57:289, section 4.1; they keep four at 5 %.
  const example = [
    0.0001, 0.0004, 0.0019, 0.0095, 0.0201, 0.0278, 0.0298, 0.0344, 0.0459, 0.324, 0.4262, 0.5719, 0.6528,
    0.759, 1
  ];

  it('keeps 4 of the 15 at 5 %', () => {
    expect(benjaminiHochberg(example).filter((p) => p <= 0.05).length).toBe(4);
  });

  it('agrees with R', () => {
    // R 4.2.2: p.adjust(p, "BH")
    const expected = [
      0.0015, 0.003, 0.0095, 0.035625, 0.0603, 0.0638571428571429, 0.0638571428571429, 0.0645, 0.0765, 0.486,
      0.581181818181818, 0.714875, 0.753230769230769, 0.813214285714286, 1
    ];
    benjaminiHochberg(example).forEach((p, i) => expect(p).toBeCloseTo(expected[i], 12));
    // R 4.2.2: p.adjust(c(.04,.01,.03,.01,.9), "BH")
    [0.05, 0.025, 0.05, 0.025, 0.9].forEach((p, i) =>
      expect(benjaminiHochberg([0.04, 0.01, 0.03, 0.01, 0.9])[i]).toBeCloseTo(p, 12)
    );
  });

  it('takes nothing and refuses what is no p-value', () => {
    expect(benjaminiHochberg([])).toEqual([]);
    for (const bad of [-0.1, 1.1, NaN]) expect(() => benjaminiHochberg([0.5, bad])).toThrow(RangeError);
  });
});
