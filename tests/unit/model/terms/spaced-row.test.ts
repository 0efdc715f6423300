import { readFormula } from '$lib/model/terms/read-formula';
import { spacedRow } from '$lib/model/terms/spaced-row';
import { describe, expect, it } from 'vitest';

/** The texts of a row, with · for a no-break space, ' for a thin one, and [] for what holds others. */
const shown = (formula: string): string =>
  spacedRow(readFormula(formula))
    .map((node) =>
      'children' in node ? '[]' : node.text.replaceAll('\u00a0', '·').replaceAll('\u2009', "'")
    )
    .join('');

describe('a row of a formula', () => {
  it.each([
    ['t ln frac{t}{F}', "t'ln'[]"],
    ['ln(1 + x)', 'ln(1+x)'],
    ['x_k "is 0 or 1"', '[]·is 0 or 1'],
    ['"ruled out:" p ≤ α', 'ruled out:·p≤α'],
    ['"compatible:" "upper limit of" x', 'compatible:·upper limit of·x'],
    ['B ~ "Bin"(N, p)', 'B~Bin(N,p)']
  ])('%s', (formula, wanted) => expect(shown(formula)).toBe(wanted));
});
