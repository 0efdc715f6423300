import type { QuotedNumber } from '../numbers/quoted-number';
import type { Span, Words } from '../span';
import { groupDigits } from './group-digits';
import { oneLine } from './one-line';

const MINUS = '\u2212';
const THIN = '\u202f';
const RAISED = '⁰¹²³⁴⁵⁶⁷⁸⁹';

/** The words as text without markup: a real minus sign, thin spaces in thousands, raised powers of ten. */
export const toPlain = (words: Words): string => words.map(plainSpan).join('');

function plainSpan(span: Span): string {
  if (span.kind === 'number') return plainNumber(span.number);
  if (span.kind === 'equation') return `${span.left} ${span.sign} ${plainNumber(span.number)}`;
  return span.kind === 'name' ? oneLine(span.text) : span.text;
}

/** "−12 350.2", "2.5 × 10⁻⁷". */
export function plainNumber({ negative, digits, power }: QuotedNumber): string {
  const times = power === null ? '' : ` × 10${raised(power)}`;
  return (negative ? MINUS : '') + groupDigits(digits, THIN) + times;
}

const raised = (power: number): string =>
  [...String(power)].map((sign) => (sign === '-' ? '⁻' : RAISED[Number(sign)])).join('');
