import { oneTimeUnit } from '$lib/model/one-time-unit';
import { describe, expect, it } from 'vitest';

const at = (label: string, time: number | null, unit: string | null) => ({ label, time, unit });

describe('oneTimeUnit', () => {
  it('shows us as µs', () => {
    expect(oneTimeUnit([at('a', 2, 'us'), at('b', 3, 'µs')], 'quench time')).toEqual({
      ok: true,
      unit: 'µs',
      times: [2, 3]
    });
  });

  it('tells all times in the unit of the first', () => {
    const found = oneTimeUnit([at('a', 2, 'µs'), at('b', 0.5, 'ms'), at('c', 700, 'ns')], 'quench time');
    expect(found).toMatchObject({ ok: true, unit: 'µs' });
    if (found.ok) [2, 500, 0.7].forEach((time, i) => expect(found.times[i]).toBeCloseTo(time, 12));
  });

  it('leaves a unit of its own as it is', () => {
    expect(oneTimeUnit([at('a', 2, 'ħ/J'), at('b', 3, 'ħ/J')], 'quench time')).toEqual({
      ok: true,
      unit: 'ħ/J',
      times: [2, 3]
    });
    expect(oneTimeUnit([at('a', 2, null), at('b', 3, null)], 'hold time')).toMatchObject({
      ok: true,
      unit: ''
    });
  });

  it.each([
    ['ħ/J', 'ms', '“b” in “ms”'],
    ['ms', null, 'in no unit'],
    ['s', 'cycles', '“cycles”']
  ])('does not guess what %s is in %s', (first, second, words) => {
    const found = oneTimeUnit([at('a', 2, first), at('b', 3, second)], 'quench time');
    expect(found).toMatchObject({ ok: false });
    if (!found.ok) expect(found.reason).toContain(words);
  });

  it('names the dataset without a time', () => {
    const found = oneTimeUnit([at('a', 2, 's'), at('b', null, null)], 'hold time');
    expect(found).toEqual({ ok: false, reason: '“b” states no hold time.' });
  });
});
