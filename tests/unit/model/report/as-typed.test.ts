import { asTyped, endAsTyped } from '$lib/model/report/as-typed';
import { sayNuisances } from '$lib/model/report/say-nuisances';
import { describe, expect, it } from 'vitest';
import { anyDiagnosis, WELDON } from '../../charts/any-diagnosis';

const bare = (text: string) => text.replace(/[\u2066-\u2069]/g, '');

describe('what a person typed', () => {
  it('stands isolated between quotation marks, without what turns direction', () => {
    expect(asTyped(' a\u202eb\u2069 ')).toBe('“\u2068ab\u2069”');
  });

  it.each([
    ['Twelve dice.', '“Twelve dice.”'],
    ['Why not?', '“Why not?”'],
    ['He said “stop.”', '“He said “stop.””'],
    ['(All of them.)', '“(All of them.)”'],
    ['全部。', '“全部。”'],
    ['لماذا؟', '“لماذا؟”'],
    ['सब।', '“सब।”'],
    ['Twelve dice', '“Twelve dice”.'],
    ['N = 1.5', '“N = 1.5”.'],
    ['', '“”.']
  ])('%s ends its sentence with one stop', (typed, shown) => {
    expect(bare(endAsTyped(typed))).toBe(shown);
  });

  it('is not followed by a second stop in the report', async () => {
    const stated = { trialsWhy: 'Twelve dice.', postSelection: 'None.' };
    const said = bare(
      sayNuisances(await anyDiagnosis(WELDON, { trials: 12 }), stated)
        .flat()
        .join(' ')
    );
    expect(said).toContain('Stated reason: “Twelve dice.” ');
    expect(said).toContain('Stated: “None.” Dropping');
  });
});
