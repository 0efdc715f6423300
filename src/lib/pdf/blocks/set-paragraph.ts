import { PAGE } from '../page/geometry';
import type { Flow } from '../page/flow';
import { tag, type Element } from '../page/tags';
import type { Span } from '../type/break-lines';
import { cleanText } from '../type/clean-text';
import { STYLES, type Style } from '../type/styles';
import type { Block } from './blocks';
import { setLines } from './set-lines';

export const spansOf = (text: string | Span[], style: Style): Span[] =>
  typeof text === 'string' ? [{ text: cleanText(text), style }] : text;

export function setParagraph(flow: Flow, block: Block & { kind: 'paragraph' }, parent: Element): void {
  const spans = spansOf(block.text, STYLES[block.look ?? 'body']);
  setLines(flow, tag(flow.doc, parent, 'P'), 'P', spans, PAGE.left, PAGE.main);
}
