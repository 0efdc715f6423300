import { conditionOfName } from '$lib/formats/conditions/condition-of-name';
import { readDay } from '$lib/formats/conditions/read-day';
import { readTime } from '$lib/formats/conditions/read-time';
import { recogniseConditions } from '$lib/formats/conditions/recognise-conditions';
import { describe, expect, it } from 'vitest';

const data = { kind: 'histogram' as const, counts: [[0, 1]] as [number, number][], lump: null };

describe('conditionOfName', () => {
  it.each([
    ['Device', 'device'],
    ['firmware version', 'firmware'],
    ['qubit_group', 'group'],
    ['Register', 'group'],
    ['quenchTime (µs)', 'quenchTime'],
    ['tau_Q', 'quenchTime'],
    ['ramp_ns', 'quenchTime'],
    ['hold time', 'holdTime'],
    ['wait_after_quench_us', 'holdTime'],
    ['N sites', 'trials'],
    ['date', 'measuredOn'],
    ['post-selection', 'postSelection'],
    ['comment', 'notes'],
    ['unit', 'unit'],
    ['temperature', null]
  ])('%s', (name, expected) => expect(conditionOfName(name)).toBe(expected));
});

describe('readTime', () => {
  it.each([
    ['2.5', 'quench_time_us', { time: 2.5, unit: 'µs' }],
    ['2,5 ns', 'quench (us)', { time: 2.5, unit: 'ns' }],
    ['1e3', 'ramp [ms]', { time: 1000, unit: 'ms' }],
    ['4', 'quench', { time: 4, unit: null }],
    ['4 J⁻¹', 'quench', { time: 4, unit: 'J⁻¹' }],
    ['-1', 'quench', null],
    ['fast', 'quench', null]
  ])('%s under %s', (cell, name, expected) => expect(readTime(cell, name)).toEqual(expected));
});

describe('readDay', () => {
  it.each([
    ['2026-03-14', '2026-03-14'],
    ['2026/3/14', '2026-03-14'],
    ['20260314', '2026-03-14'],
    ['14.3.2026', '2026-03-14'],
    ['2026-03-14T09:30:00Z', '2026-03-14'],
    ['3/14/2026', '2026-03-14'],
    ['14/3/2026', '2026-03-14'],
    // Third of April or fourth of March: not said, so not guessed.
    ['3/4/2026', null],
    ['2026-02-30', null],
    ['spring', null]
  ])('%s', (cell, expected) => expect(readDay(cell)).toBe(expected));
});

describe('recogniseConditions', () => {
  it('fills the fields and keeps what fits none in the notes', () => {
    const { conditions, said } = recogniseConditions({
      name: 'x',
      data,
      suggested: { trials: 48, misread: 0.02 },
      conditions: {
        chip: 'Kelp',
        quench_us: '2.5',
        hold: 'long',
        geometry: 'periodic chain',
        'counted in': 'pairs',
        sites: '48',
        temperature: '20 mK',
        date: '3/4/2026'
      }
    });
    expect(conditions).toMatchObject({
      name: 'x',
      device: 'Kelp',
      quenchTime: 2.5,
      quenchUnit: 'µs',
      holdTime: null,
      geometry: 'ring-bonds',
      unit: 'pair',
      trials: 48,
      trialsWhy: 'Stated in the file.',
      misread: 0.02,
      measuredOn: null
    });
    expect(conditions.notes).toBe('hold: long\ntemperature: 20 mK\ndate: 3/4/2026');
    expect(said).toHaveLength(8);
  });

  it('takes the first of two columns for the same condition', () => {
    const both = { device: 'Kelp', chip: 'B7' };
    const { conditions } = recogniseConditions({ name: 'x', data, suggested: {}, conditions: both });
    expect(conditions).toMatchObject({ device: 'Kelp', notes: 'chip: B7' });
  });
});
