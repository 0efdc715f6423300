import type { MathNode } from './math-node';

const NO_BREAK = '\u00a0';
const THIN = '\u2009';

/**
 * A row of a formula with the room that words and names of functions need in it: MathML sets `ln` and text hard against
 * a letter or a fraction beside them. Beside an operator, which brings room of its own, and at either end none is added.
 */
export const spacedRow = (nodes: readonly MathNode[]): MathNode[] =>
  nodes.map((node, i) => {
    if ('children' in node) return node;
    const room = node.tag === 'mtext' ? NO_BREAK : node.tag === 'mi' && node.text.length > 1 ? THIN : '';
    const before = isTight(nodes[i - 1]) || nodes[i - 1]?.tag === 'mtext' ? '' : room;
    const after = isTight(nodes[i + 1]) ? '' : room;
    return { ...node, text: before + node.text + after };
  });

const isTight = (node: MathNode | undefined): boolean => node === undefined || node.tag === 'mo';
