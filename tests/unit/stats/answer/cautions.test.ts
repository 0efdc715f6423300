import { cautions } from '$lib/stats/answer/cautions';
import { defaultOptions } from '$lib/stats/default-options';
import type { Histogram } from '$lib/stats/types';
import { describe, expect, it } from 'vitest';
import { evidence, ran, type Made } from '../flags/make-evidence';

const plain: Histogram = { kind: 'histogram', counts: [[0, 3000]], lump: null };
const all = (made: Made, histogram = plain) => {
  const of = evidence(made);
  return cautions(of, histogram, of.tests).join('\n');
};

describe('cautions', () => {
  it('always say what a screen is not, and what it must not be used for', () => {
    const text = all({});
    expect(text).toContain('not a physical proof in either direction');
    expect(text).toContain('does not replace calibration');
    expect(text).toContain('qualified staff where high voltage, lasers, cryogens or magnets are run');
    expect(text).toContain('people’s safety depends on');
    expect(text).toContain('does not mean independent');
    expect(text).toContain('alike and independent of each other');
    expect(cautions(evidence(), plain, evidence().tests)).toHaveLength(3);
  });

  it.each<[string, Made, RegExp]>([
    ['an unknown N', { over: { trials: null } }, /number of trials was not given/],
    [
      'kinks without a misread rate',
      { over: { options: { ...defaultOptions, geometry: 'open-bonds' } } },
      /No misread rate was stated/
    ],
    [
      'a misread rate that is allowed for',
      { over: { misread: { applies: true, rate: 0.01 } } },
      /1\.0\u202f% a site was stated, and every test/
    ],
    [
      'a misread rate that is not',
      { over: { misread: { applies: false, reason: 'It is written down, but not allowed for.' } } },
      /not allowed for/
    ],
    [
      'odd counts on a ring',
      {
        over: {
          options: { ...defaultOptions, geometry: 'ring-bonds' },
          even: { seen: 2990, expected: 0.5, oneCountAlone: false }
        }
      },
      /the 10 shots with an odd count were read or written wrongly/
    ],
    ['few shots', { over: { shots: 299 } }, /fewer than about 300 shots/]
  ])('name %s', (_name, made, want) => {
    expect(all(made)).toMatch(want);
    expect(all({})).not.toMatch(want);
  });

  it('say what a lump does to the moments', () => {
    const text = all({}, { ...plain, lump: { from: 10, shots: 18 } });
    expect(text).toMatch(/counts of 10 and more.*lower limits/);
  });

  it('say when resampling ended early, and when p is as small as it can be', () => {
    const stopped = evidence();
    stopped.tests = [{ ...ran('fit', 0.6), stoppedEarly: true }];
    expect(cautions(stopped, plain, stopped.tests).join()).toContain('Besag and Clifford');
    const smallest = evidence();
    smallest.tests = [{ ...ran('fit', 0.0005), p: 0.0005 }];
    expect(cautions(smallest, plain, smallest.tests).join()).toContain('the truth may be smaller');
  });

  it('say when the resamples are too few for α', () => {
    const few = evidence();
    few.tests = few.tests.map((test) => ({ ...test, smallestP: 1 / 200, resamples: 199 }));
    const text = cautions(few, plain, few.tests).join();
    expect(text).toMatch(
      /no test can reach the level of 0\.010 once adjusted for 6 tests; that takes at least 600/
    );
  });
});
