import { describe, expect, it } from 'vitest';
import { violations } from '$lib/stats/calibration/violations';
import type { StoryId } from '$lib/stats/explanations/types';
import { fitData } from '$lib/stats/fit/fit-data';
import { toHistogram } from '$lib/stats/input/to-histogram';
import { generator } from '$lib/stats/random/generator';
import { dense, drawn, ranking, storyOf } from './setting';

const SHOTS = 20_000;
const REPEATS = 10;

/*
 * Share of 40 repeats in which the true cause had the best AIC, and in which it was best or tied (AIC < 2 behind):
 *   common cause N = 64: ρ 0.001 18 %, 95 %; 0.004 60 %, 98 %; 0.016 83 %, 95 %
 *   chain N = 48: c 0.02 25 %, 90 %; 0.06 33 %, 98 %; 0.15 73 %, 93 %; 0.25 88 %, 98 %; 0.4 100 %
 *   two settings N = 64: δ 0.01 35 %, 93 %; 0.02 78 %, 93 %; 0.04 100 %
 *   bursts 0.05 %, 0.2 %, 0.8 %: 100 %; dead shots 0.3 % 85 %, 98 %; 1 %, 3 % 100 %; pair loss 0.2, 0.5, 0.8: 100 %
 *   misread sites N = 50: ε 0.01 88 %, 93 %; 0.03 100 %
 * Below, fewer repeats of those that can be told apart, and of some that cannot.
 */
const drawnBy = (id: string, r: number, strength: number) => {
  const violation = violations.find((one) => one.id === id)!;
  return fitData(toHistogram(violation.draw(generator(900 + r, 3), SHOTS, strength)), violation.trials);
};

function led(id: StoryId, geometry: 'sites' | 'open-bonds', draw: (r: number) => ReturnType<typeof drawnBy>) {
  let first = 0;
  let tied = 0;
  for (let r = 0; r < REPEATS; r++) {
    const found = ranking(draw(r), geometry).find((one) => one.id === id)!;
    if (found.behind === 0) first++;
    if (found.behind < 2) tied++;
  }
  return { first, tied };
}

describe('at 20 000 shots', () => {
  it.each([
    ['bursts', 0.002],
    ['dead-shots', 0.01],
    ['two-settings', 0.04],
    ['pair-loss', 0.5],
    ['common-cause', 0.03]
  ] as [StoryId, number][])('%s of strength %d leads in eight of ten repeats', (id, strength) => {
    expect(led(id, 'sites', (r) => drawnBy(id, r, strength)).first).toBeGreaterThanOrEqual(8);
  });

  it.each([
    ['neighbours', 'sites', 0.1, 0.4, 48],
    ['misread-sites', 'open-bonds', 0.05, 0.03, 50]
  ] as const)('%s leads in eight of ten repeats', (id, geometry, p, own, trials) => {
    const law = dense(storyOf(id).window(p, [own], trials, trials), trials);
    const draw = (r: number) => drawn(generator(910 + r, 3), law, SHOTS, trials);
    expect(led(id, geometry, draw).first).toBeGreaterThanOrEqual(8);
  });

  it('what the counts cannot tell apart is tied with the truth, and does not hide it', () => {
    for (const [id, strength] of [
      ['common-cause', 0.001],
      ['neighbours', 0.06],
      ['two-settings', 0.01]
    ] as [StoryId, number][]) {
      expect(led(id, 'sites', (r) => drawnBy(id, r, strength)).tied).toBeGreaterThanOrEqual(8);
      const ranks = ranking(drawnBy(id, 0, strength), 'sites');
      expect(ranks.filter(({ behind }) => behind < 2).length).toBeGreaterThan(1);
    }
  });
});
