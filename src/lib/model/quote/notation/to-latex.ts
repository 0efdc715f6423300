import type { QuotedNumber } from '../numbers/quoted-number';
import type { Span, Words } from '../span';
import { escapeLatex } from './escape-latex';
import { groupDigits } from './group-digits';
import { oneLine } from './one-line';

/** The words for a LaTeX source: numbers and formulas in $…$, for a standard class without any package. */
export const toLatex = (words: Words): string => words.map(latexSpan).join('');

function latexSpan(span: Span): string {
  switch (span.kind) {
    case 'text':
      return escapeLatex(span.text, false);
    case 'emphasis':
      return `\\emph{${escapeLatex(span.text, false)}}`;
    case 'name':
      return escapeLatex(oneLine(span.text));
    case 'code':
      return latexCode(span.text);
    case 'math':
      return `$${formula(span.text)}$`;
    case 'number':
      return `$${latexNumber(span.number)}$`;
    case 'equation':
      return `$${formula(span.left)} ${formula(span.sign)} ${latexNumber(span.number)}$`;
  }
}

/** Long words for machines may break after every eighth sign, without a hyphen, which would look like a part. */
export const latexCode = (text: string): string =>
  `\\texttt{${(text.match(/.{1,8}/gsu) ?? []).map((part) => escapeLatex(part)).join('\\allowbreak{}')}}`;

function latexNumber({ negative, digits, power }: QuotedNumber): string {
  const times = power === null ? '' : ` \\times 10^{${power}}`;
  return (negative ? '-' : '') + groupDigits(digits, '\\,') + times;
}

const SIGNS: Record<string, string> = {
  μ: '\\mu ',
  α: '\\alpha ',
  β: '\\beta ',
  ρ: '\\rho ',
  θ: '\\theta ',
  ε: '\\varepsilon ',
  '−': '-',
  '≤': '\\le',
  '²': '^2'
};

const formula = (plain: string): string =>
  plain.replace(/[^\p{ASCII}]/gu, (sign) => SIGNS[sign] ?? sign).trim();
