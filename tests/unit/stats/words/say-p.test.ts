import { sayHowOften, sayP } from '$lib/stats/words/say-p';
import { sayTest } from '$lib/stats/words/say-test';
import { describe, expect, it } from 'vitest';
import { ran } from '../flags/make-evidence';

const thin = '\u202f';

describe('sayHowOften', () => {
  it.each([
    [1, 'would turn up in practically every repeat of the experiment'],
    [0.36, 'would turn up in 36 of 100 repeats of the experiment'],
    [0.104, 'would turn up in 10 of 100 repeats of the experiment'],
    [0.1, 'would turn up once in 10 repeats of the experiment'],
    [0.05, 'would turn up once in 20 repeats of the experiment'],
    [0.00029, `would turn up once in 3${thin}400 repeats of the experiment`],
    [1e-12, 'would turn up once in 1.0 × 10¹² repeats of the experiment']
  ])('says %s as "%s"', (p, want) => {
    expect(sayHowOften(p)).toBe(want);
  });

  it('says "at most" at the smallest p that could be shown', () => {
    expect(sayHowOften(0.0005, 0.0005)).toBe(
      `would turn up at most once in 2${thin}000 repeats of the experiment`
    );
    expect(sayHowOften(0.001, 0.0005)).not.toContain('at most');
  });
});

describe('sayP', () => {
  it('puts the number second, with the draws behind it', () => {
    expect(sayP(0.0005, 0.0005, 1999)).toBe(
      `would turn up at most once in 2${thin}000 repeats of the experiment (p ≤ 0.00050, 1${thin}999 resamples)`
    );
    expect(sayP(0.36, 0.0005, 277)).toMatch(/36 of 100 .* \(p = 0\.36, 277 resamples\)$/);
    // An exact p has no draws and no smallest value.
    expect(sayP(0.02, 0, 0)).toMatch(/\(p = 0\.020\)$/);
  });

  it('is what a test says of itself', () => {
    const test = ran('ceiling', 0.03);
    expect(sayTest(test)).toBe(sayP(test.p, test.smallestP, test.resamples));
  });
});
