import { conditionsSchema, bareConditions } from '$lib/model/team/datasets/conditions';
import { unturned } from '$lib/model/unturned';
import { describe, expect, it } from 'vitest';

describe('text that turns nothing after it', () => {
  it('loses what embeds or overrides a direction, and nothing else', () => {
    expect(unturned('\u202Eecived\u202C א\u200f👩\u200d🔬')).toBe('ecived א\u200f👩\u200d🔬');
  });
  it('is what a dataset keeps', () => {
    const kept = conditionsSchema.parse({
      ...bareConditions('\u202elive\u202c'),
      device: '\u2067 chip \u2069',
      notes: '\u202e'
    });
    expect([kept.name, kept.device, kept.notes]).toEqual(['live', 'chip', null]);
    expect(conditionsSchema.safeParse(bareConditions('\u202e')).success).toBe(false);
  });
});
