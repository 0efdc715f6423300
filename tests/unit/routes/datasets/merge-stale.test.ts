import { bareConditions } from '$lib/model/team/datasets/conditions';
import { typedConditions } from '$lib/model/team/datasets/typed-conditions';
import { describe, expect, it } from 'vitest';
import { mergeStale } from '../../../../src/routes/(team)/team/[team=slug]/datasets/[id]/merge-stale';

const opened = typedConditions({ ...bareConditions('one'), device: 'Kelp', notes: 'line\nline' });
const current = { ...bareConditions('one'), device: 'Marram', firmware: 'ebb 3.1', notes: 'line\nline' };

describe('mergeStale', () => {
  it('keeps what was typed, takes over what was left alone, and tells both', () => {
    const typed = { ...opened, device: 'Samphire', misread: '0.0x', notes: 'line\r\nline' };
    const merged = mergeStale(typed, JSON.stringify(opened), current);
    expect(merged.typed).toMatchObject({ device: 'Samphire', misread: '0.0x', firmware: 'ebb 3.1' });
    expect(merged.others).toEqual([
      { name: 'device', label: 'Device', from: 'Kelp', to: 'Marram', both: true },
      { name: 'firmware', label: 'Firmware version', from: '', to: 'ebb 3.1', both: false }
    ]);
  });

  it('both wrote the same: told, and nothing to choose', () => {
    const merged = mergeStale({ ...opened, device: 'Marram' }, JSON.stringify(opened), current);
    expect(merged.others[0]).toMatchObject({ name: 'device', both: false });
  });

  it.each(['', '{', 'null', '7', '[]'])('without a beginning (%j) everything counts as typed', (before) => {
    const typed = { ...opened, device: 'Samphire' };
    const merged = mergeStale(typed, before, current);
    expect(merged.typed.device).toBe('Samphire');
    expect(merged.others.map(({ name }) => name)).toContain('device');
  });
});
