import type { MathNode } from './math-node';

const TOKEN = /\s+|"[^"]*"|\d+(?:[.\u2009]\d+)*|[A-Za-z]+|\p{L}|[^\s]/gu;
/** Signs whose limits stand below and above them. */
const BIG: Record<string, MathNode> = {
  sum: { tag: 'mo', text: '∑' },
  prod: { tag: 'mo', text: '∏' },
  sup: { tag: 'mo', text: 'sup' },
  max: { tag: 'mo', text: 'max' },
  min: { tag: 'mo', text: 'min' }
};

/**
 * Formulas are written in one line of plain signs and become MathML: `κ_2 ≤ μ(1 − frac{μ}{N})`.
 *
 * - a letter is a variable, a run of letters an upright name (`ln`), digits a number, `"words"` text;
 * - `x_k`, `x^2`, `x_k^2`; `{…}` holds several signs together; `sum_k`, `prod`, `sup`, `max`, `min` take limits;
 * - `frac{a}{b}`, `sqrt{a}`, `hat{a}`; every other sign is an operator.
 *
 * @returns the nodes of one row
 * @throws Error that names the place, when a brace or an argument is missing
 */
export function readFormula(text: string): MathNode[] {
  const tokens = (text.match(TOKEN) ?? []).filter((token) => token.trim() !== '');
  let at = 0;
  const fail = (what: string): never => {
    throw new Error(`${what} in the formula “${text}”, sign ${at + 1}`);
  };
  const nodes = row(false);
  if (at < tokens.length) fail('An unmatched }');
  return nodes;

  function row(inBraces: boolean): MathNode[] {
    const items: MathNode[] = [];
    while (at < tokens.length && tokens[at] !== '}') items.push(withScripts());
    if (inBraces && tokens[at++] !== '}') fail('A missing }');
    return items;
  }

  function withScripts(): MathNode {
    const big = tokens[at] in BIG;
    const base = atom();
    const scripts: Partial<Record<'_' | '^', MathNode>> = {};
    while (tokens[at] === '_' || tokens[at] === '^') {
      const kind = tokens[at++] as '_' | '^';
      scripts[kind] = atom();
    }
    const { _: below, '^': above } = scripts;
    if (below && above) return { tag: big ? 'munderover' : 'msubsup', children: [base, below, above] };
    if (below) return { tag: big ? 'munder' : 'msub', children: [base, below] };
    if (above) return { tag: big ? 'mover' : 'msup', children: [base, above] };
    return base;
  }

  function argument(): MathNode {
    return tokens[at] === '{' ? atom() : fail('A missing {');
  }

  function atom(): MathNode {
    if (at >= tokens.length || tokens[at] === '}') fail('Something missing');
    const token = tokens[at++];
    if (token === '{') {
      const items = row(true);
      return items.length === 1 ? items[0] : { tag: 'mrow', children: items };
    }
    if (token === 'frac') return { tag: 'mfrac', children: [argument(), argument()] };
    if (token === 'sqrt') return { tag: 'msqrt', children: [argument()] };
    if (token === 'hat') return { tag: 'mover', children: [argument(), { tag: 'mo', text: '^' }] };
    if (token in BIG) return BIG[token];
    if (token.startsWith('"')) return { tag: 'mtext', text: token.slice(1, -1) };
    if (/^\d/.test(token)) return { tag: 'mn', text: token };
    if (/^\p{L}/u.test(token)) return { tag: 'mi', text: token };
    return { tag: 'mo', text: token };
  }
}
