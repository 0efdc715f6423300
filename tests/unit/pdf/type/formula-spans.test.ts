import { formulaSpans } from '$lib/pdf/type/formula-spans';
import { STYLES } from '$lib/pdf/type/styles';
import { describe, expect, it } from 'vitest';

describe('formulaSpans', () => {
  it('leans letters, lowers after _ and raises after ^, leaves words and Greek upright', () => {
    const spans = formulaSpans('κ_2 ln h_{nk} e^θ', STYLES.formula);
    const told = spans.map(({ text, style }) => [text, style.face, Math.sign(style.rise ?? 0)]);
    expect(told).toEqual([
      ['κ', 'text', 0],
      ['2', 'text', -1],
      [' ', 'text', 0],
      ['ln', 'text', 0],
      [' ', 'text', 0],
      ['h', 'italic', 0],
      ['nk', 'italic', -1],
      [' ', 'text', 0],
      ['e', 'italic', 0],
      ['θ', 'text', 1]
    ]);
  });
});
