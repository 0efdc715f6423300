import type { MathNode } from './math-node';
import { readFormula } from './read-formula';
import { spacedRow } from './spaced-row';

/**
 * A formula in readFormula's notation as MathML.
 *
 * It is text rather than components: a page of terms has over a hundred formulas, and the marks that components leave
 * between their elements were two thirds of a report's nodes, a third of its bytes.
 */
export const formulaMarkup = (line: string): string =>
  `<math display="block">${rowMarkup(readFormula(line))}</math>`;

const rowMarkup = (nodes: readonly MathNode[]): string => spacedRow(nodes).map(nodeMarkup).join('');

function nodeMarkup(node: MathNode): string {
  if ('children' in node) return `<${node.tag}>${rowMarkup(node.children)}</${node.tag}>`;
  return `<${node.tag}${attributes(node)}>${escaped(node.text)}</${node.tag}>`;
}

/** A letter says that it is upright, and the sheet slopes it; a bar stands close. */
function attributes({ tag, text }: { tag: string; text: string }): string {
  if (tag === 'mi' && text.length === 1) return ' mathvariant="normal"';
  return text === '|' ? ' lspace="0" rspace="0"' : '';
}

const SIGNS: Record<string, string> = { '&': '&amp;', '<': '&lt;', '>': '&gt;' };
const escaped = (text: string): string => text.replace(/[&<>]/g, (sign) => SIGNS[sign]);
