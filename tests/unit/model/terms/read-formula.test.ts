import type { MathNode } from '$lib/model/terms/math-node';
import { readFormula } from '$lib/model/terms/read-formula';
import { describe, expect, it } from 'vitest';

/** MathML as text, so that the expectations below are what a browser is given. */
const markup = (nodes: MathNode[]): string =>
  nodes
    .map((node) =>
      'children' in node
        ? `<${node.tag}>${markup(node.children)}</${node.tag}>`
        : `<${node.tag}>${node.text}</${node.tag}>`
    )
    .join('');

describe('a formula in one line', () => {
  it.each([
    ['κ_2 ≤ μ', '<msub><mi>κ</mi><mn>2</mn></msub><mo>≤</mo><mi>μ</mi>'],
    ['ln x', '<mi>ln</mi><mi>x</mi>'],
    ['p_k^2', '<msubsup><mi>p</mi><mi>k</mi><mn>2</mn></msubsup>'],
    ['p^2_k', '<msubsup><mi>p</mi><mi>k</mi><mn>2</mn></msubsup>'],
    ['e^{−x}', '<msup><mi>e</mi><mrow><mo>−</mo><mi>x</mi></mrow></msup>'],
    ['sum_k^N p', '<munderover><mo>∑</mo><mi>k</mi><mi>N</mi></munderover><mi>p</mi>'],
    ['prod_k', '<munder><mo>∏</mo><mi>k</mi></munder>'],
    ['frac{1}{N+1}', '<mfrac><mn>1</mn><mrow><mi>N</mi><mo>+</mo><mn>1</mn></mrow></mfrac>'],
    ['sqrt{2 x}', '<msqrt><mrow><mn>2</mn><mi>x</mi></mrow></msqrt>'],
    ['hat{p}_n', '<msub><mover><mi>p</mi><mo>^</mo></mover><mi>n</mi></msub>'],
    ['"upper limit" x', '<mtext>upper limit</mtext><mi>x</mi>'],
    ['0.05', '<mn>0.05</mn>']
  ])('%s', (text, wanted) => {
    expect(markup(readFormula(text))).toBe(wanted);
  });

  it.each(['x_', 'frac{1}', 'frac 1 2', '{x', 'x}', 'x_}'])('refuses %s', (text) => {
    expect(() => readFormula(text)).toThrow(/in the formula/);
  });
});
