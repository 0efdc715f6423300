import type { QuotedNumber } from './numbers/quoted-number';

/**
 * The words to quote, before any notation: each sentence is built once, and plain text, LaTeX and Markdown are
 * three ways to write the same spans.
 */
export type Span =
  | { kind: 'text'; text: string }
  | { kind: 'emphasis'; text: string }
  /** What people typed: a name in any script, never read as markup. */
  | { kind: 'name'; text: string }
  /** A digest or another word for machines. */
  | { kind: 'code'; text: string }
  /** A formula in its plain spelling: "μ(1 − μ/N)". Letters are symbols. */
  | { kind: 'math'; text: string }
  | { kind: 'number'; number: QuotedNumber }
  /** "p ≤ 0.00050": one formula, which does not break. */
  | { kind: 'equation'; left: string; sign: '=' | '≤'; number: QuotedNumber };

export type Words = Span[];
type Piece = string | Span | Words;

/** A sentence from a template: strings in it are text, spans and lists of spans stay what they are. */
export function words(strings: TemplateStringsArray, ...pieces: Piece[]): Words {
  return joined(strings.flatMap((text, i): Piece[] => [text, ...(i < pieces.length ? [pieces[i]] : [])]));
}

/** Pieces in a row, neighbouring texts made one. */
export function joined(pieces: Piece[], between = ''): Words {
  const out: Words = [];
  const spans = pieces.map((piece) => {
    if (typeof piece === 'string') return piece === '' ? [] : [text(piece)];
    return Array.isArray(piece) ? piece : [piece];
  });
  for (const [i, list] of spans.filter((one) => one.length > 0).entries()) {
    for (const span of i > 0 && between !== '' ? [text(between), ...list] : list) {
      const last = out.at(-1);
      if (span.kind === 'text' && last?.kind === 'text') out[out.length - 1] = text(last.text + span.text);
      else out.push(span);
    }
  }
  return out;
}

/** "a, b and c". */
export function listed(items: Piece[]): Words {
  if (items.length < 2) return joined(items);
  return joined([joined(items.slice(0, -1), ', '), ' and ', items[items.length - 1]]);
}

export const text = (of: string): Span => ({ kind: 'text', text: of });
export const emphasis = (of: string): Span => ({ kind: 'emphasis', text: of });
export const nameOf = (of: string): Span => ({ kind: 'name', text: of });
export const code = (of: string): Span => ({ kind: 'code', text: of });
export const math = (of: string): Span => ({ kind: 'math', text: of });
export const number = (of: QuotedNumber): Span => ({ kind: 'number', number: of });
export const equation = (left: string, sign: '=' | '≤', of: QuotedNumber): Span => ({
  kind: 'equation',
  left,
  sign,
  number: of
});
