import { countTicks } from '$lib/charts/count-ticks';
import { distributionPicture } from '$lib/charts/distribution-picture';
import { scaleLinear } from 'd3-scale';
import { describe, expect, it } from 'vitest';
import { anyDiagnosis, WELDON } from './any-diagnosis';

describe('ticks of counts', () => {
  // Two counts beyond each edge are drawn: 1 to 11 for "0–3" and "9+".
  const x = scaleLinear([0.4, 11.6], [0, 700]);

  it('stand under the middle of what lumps counts, and no other under these', () => {
    const ticks = countTicks(x, 13, [{ count: 3, below: true }, { count: 9 }]);
    expect(ticks.map(({ text }) => text)).toEqual(['4', '5', '6', '7', '8', '0–3', '9+']);
    expect(ticks.slice(-2).map(({ at }) => x.invert(at))).toEqual([
      expect.closeTo(2, 9),
      expect.closeTo(10, 9)
    ]);
  });

  it('name every whole count without a lump', () => {
    expect(countTicks(x, 13).map(({ text }) => text)).toEqual(
      Array.from({ length: 11 }, (_, i) => `${i + 1}`)
    );
  });

  it('keep the closing lump where two have no room', () => {
    const narrow = scaleLinear([0.4, 11.6], [0, 30]);
    expect(countTicks(narrow, 13, [{ count: 3, below: true }, { count: 9 }]).map(({ text }) => text)).toEqual(
      ['9+']
    );
  });
});

it('a lump is read out over the middle of its bar, with all its shots', async () => {
  const diagnosis = await anyDiagnosis(
    WELDON.slice(3, 8),
    { trials: 12 },
    { from: 8, shots: 526 },
    { to: 2, shots: 4599 }
  );
  const { readings, marks, legend } = distributionPicture(diagnosis, { width: 760, text: 13 });
  expect(readings.map(({ words }) => words().split(':')[0])).toEqual([
    'Count 2 or fewer',
    'Count 3',
    'Count 4',
    'Count 5',
    'Count 6',
    'Count 7',
    'Count 8 or more'
  ]);
  expect(readings[0].words()).toContain('seen in 4\u202f599 of 26\u202f306 shots');
  const steps = readings.slice(1).map(({ x }, i) => x - readings[i].x);
  // The bars of both lumps cover three counts each.
  expect(steps.map((step) => Math.round((100 * step) / steps[1]) / 100)).toEqual([2, 1, 1, 1, 1, 2]);
  expect(marks.filter((mark) => mark.kind === 'path' && mark.role.startsWith('range'))).toHaveLength(2);
  expect(legend.map(({ label }) => label).join()).toContain('a row that lumps counts');
});
