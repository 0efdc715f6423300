import { describe, expect, it } from 'vitest';
import { FRESH_PLAN, type PlanFields } from '$lib/page/plan/fields';
import { oddsOf } from '$lib/page/plan/odds-of';
import { readOdds, readPlan } from '$lib/page/plan/read-plan';
import { sayOdds, sayPlan } from '$lib/page/plan/say-plan';
import { shotsToSee } from '$lib/stats/planning/shots-to-see';

const typed = (more: Partial<PlanFields>): PlanFields => ({
  ...FRESH_PLAN,
  mean: '4',
  trials: '50',
  size: '0.1',
  ...more
});

describe('readPlan', () => {
  it('reads a plan, N unknown included', () => {
    expect(readPlan(typed({ trials: 'unknown', shots: '1 000' }))).toEqual({
      ok: true,
      asked: { kind: 'excess', mean: 4, trials: null, size: 0.1, shots: 1000, alpha: 0.05, power: 0.8 }
    });
  });

  it.each([
    [{ find: 'zzz' }, 'find', /no effect called “zzz”/],
    [{ mean: '50' }, 'mean', /below N = 50/],
    [{ mean: '0' }, 'mean', /above 0/],
    [{ mean: '' }, 'mean', /mean count/],
    [{ find: 'misread', size: '0.5' }, 'size', /below 0\.5/],
    [{ find: 'misread', size: '0.1' }, 'size', /Misreads alone/],
    [{ find: 'pairs', trials: '' }, 'trials', /needs N/],
    [{ find: 'neighbours', trials: '5000' }, 'trials', /at most 2000/],
    [{ trials: '1', mean: '0.5' }, 'trials', /at least 2/],
    [{ alpha: '0.5' }, 'alpha', /below 0\.5/],
    [{ power: '1' }, 'power', /0\.9999/],
    [{ power: '0.04' }, 'power', /above the level/],
    [{ size: '' }, 'size', /Write a size/],
    [{ size: '60' }, 'size', /below 49/],
    [{ shots: '3.5' }, 'shots', /whole number/],
    [{ find: 'constellations' }, 'find', /Choose/]
  ] as const)('refuses %o beside %s', (more, field, words) => {
    const read = readPlan(typed(more));
    expect(read.ok).toBe(false);
    if (!read.ok) expect(read.problems[field]).toMatch(words);
  });

  it('says the plan in a sentence', () => {
    const read = readPlan(typed({ trials: '' }));
    if (!read.ok) throw new Error('refused');
    const needed = shotsToSee({ ...read.asked, size: 0.1 }, read.asked);
    expect(sayPlan(read.asked, { needed, smallest: null })[0]).toMatch(
      /^1\u202f\d{3} shots show an excess of 0\.1 in 80 of 100 experiments/
    );
  });
});

describe('the odds of a lucky shot', () => {
  it('from a mean: equal trials', () => {
    const read = readOdds(typed({ mean: '4.8', trials: '40', most: '0' }));
    if (!read.ok) throw new Error('refused');
    const found = oddsOf(read.asked);
    if (!found.ok) throw new Error(found.problem);
    // 0.88^−40 = 166.2.
    expect(sayOdds(0, found.odds)).toBe(
      'A shot with no defect comes once in 166 shots, under equal trials of this mean.'
    );
  });

  it('from counts: the best law, and the share seen with it', () => {
    // Weldon's dice, Pearson 1900: its best law is equal trials, 26 306 · (1 − 0.3376986)^12 = 187.
    const counts = '0,185\n1,1149\n2,3265\n3,5475\n4,6114\n5,5194\n6,3067\n7,1331\n8,403\n9,105\n10,14\n11,4';
    const read = readOdds(typed({ mean: '', trials: '12', most: '0', counts }));
    if (!read.ok) throw new Error('refused');
    const found = oddsOf(read.asked);
    if (!found.ok) throw new Error(found.problem);
    expect(found.odds.lucky.exact / (1 - 0.3376986) ** 12).toBeCloseTo(1, 3);
    expect(found.odds.lucky.observed).toMatchObject({ shots: 185, share: 185 / 26306 });
  });

  it.each([
    [{ counts: '0,5\nx,3' }, /Line 2/],
    [{ counts: '0,5\n60,3' }, /more than N = 50/]
  ])('refuses %o in words', (more, words) => {
    const read = readOdds(typed({ most: '1', ...more }));
    if (!read.ok) throw new Error('refused');
    const found = oddsOf(read.asked);
    expect(found.ok ? '' : found.problem).toMatch(words);
  });

  it('refuses a number of defects that is none', () => {
    const read = readOdds(typed({ most: 'few' }));
    expect(read.ok ? '' : read.problems.most).toMatch(/whole number/);
  });
});
