import type { DecimalMark, ThousandsMark } from '../types';

/** Marks that are settled for the whole file; null where nothing settles them. */
export interface NumberStyle {
  decimal: DecimalMark | null;
  thousands: ThousandsMark | null;
}

export type BadNumber =
  'missing' | 'not-a-number' | 'infinite' | 'negative' | 'fraction' | 'ambiguous' | 'share' | 'too-large';

export type Written = 'plain' | 'exponent' | 'zero-decimal' | 'grouped';

export type WholeNumber =
  | { ok: true; value: number; written: Written; mark: '' | '.' | ',' | ' ' | "'" }
  | { ok: false; bad: BadNumber };

/** Characters of the longest cell that is looked at closely. */
const longest = 60;

const bad = (reason: BadNumber): WholeNumber => ({ ok: false, bad: reason });

/** Missing values as statistics programs and spreadsheets write them. */
const missing = /^(nan|n\/?a|null|none|nil|missing|-+|[–—?.…]|#(n\/a|num!|value!|div\/0!|ref!|name\?))$/i;
const infinite = /^[+\-−]?(inf|infinity|∞)$/i;
/** Plain, no-break, figure, thin and narrow no-break space; apostrophes of Swiss usage. */
const spaceGroups = /^\d{1,3}(?:([ \u00a0\u2007\u2009\u202f'’])\d{3})(?:\1\d{3})*(?!\d)/;
const form = /^(\d*)([.,]?)(\d*)(?:e([+\-−]?\d+))?$/i;

/**
 * Reads a whole number ≥ 0 the way people and programs write one.
 *
 * Understood: `12`, `+12`, `1e3`, `1.5e1`, `1 000` (also with thin or no-break spaces and
 * apostrophes), `1,149,265`, and a decimal part of zeros, `12.0` or `12,0`, which spreadsheets and
 * data frames add to whole numbers. One comma or point before exactly three digits (`1.149`,
 * `1,000`) may group thousands or start decimals: that is `ambiguous` unless `style` settles it.
 * Exact: the digits decide, never a rounded float. Values above 2^53 are `too-large`.
 */
export function readWholeNumber(cell: string, style: NumberStyle): WholeNumber {
  // Nearly every cell: at most 15 digits fit a double exactly.
  if (/^\d{1,15}$/.test(cell)) return { ok: true, value: Number(cell), written: 'plain', mark: '' };
  const trimmed = cell.trim();
  // No number needs more; patterns that look for a whole cell would crawl over a megabyte of text.
  if (trimmed.length > longest) return bad(/^\d+$/.test(trimmed) ? 'too-large' : 'not-a-number');
  if (trimmed === '' || missing.test(trimmed)) return bad('missing');
  if (infinite.test(trimmed)) return bad('infinite');
  if (/^[+\-−]?[\d.,]+\s*%$/.test(trimmed)) return bad('share');
  const negative = /^[-−]/.test(trimmed);
  const read = readUnsigned(trimmed.replace(/^[+\-−]\s*/, ''), style);
  if (!negative || (read.ok && read.value === 0)) return read;
  return read.ok || read.bad === 'fraction' || read.bad === 'ambiguous' || read.bad === 'too-large'
    ? bad('negative')
    : read;
}

function readUnsigned(text: string, style: NumberStyle): WholeNumber {
  let body = text;
  let written: Written = 'plain';
  let mark: '' | '.' | ',' | ' ' | "'" = '';
  const spaced = spaceGroups.exec(body);
  if (spaced) {
    body = spaced[0].replace(/\D/g, '') + body.slice(spaced[0].length);
    written = 'grouped';
    mark = /['’]/.test(spaced[1]) ? "'" : ' ';
  }
  const groups = /^\d{1,3}([.,])\d{3}(?:\1\d{3})*(?!\d)/.exec(body);
  if (groups && groupsThousands(body, groups, style)) {
    body = groups[0].replace(/\D/g, '') + body.slice(groups[0].length);
    written = 'grouped';
    mark = groups[1] as '.' | ',';
  }
  const parts = form.exec(body);
  if (!parts || (parts[1] === '' && parts[3] === '')) return bad('not-a-number');
  const [, whole, point, decimals, exponent] = parts;
  if (point !== '' && point === style.thousands) return bad('not-a-number');
  if (point !== '' && style.decimal !== null && point !== style.decimal) return bad('not-a-number');
  if (isAmbiguous(whole, point, decimals, exponent, style)) return bad('ambiguous');
  const value = exactValue(whole + decimals, Number((exponent ?? '0').replace('−', '-')) - decimals.length);
  if (value === null) return bad('fraction');
  if (value > 2 ** 53) return bad('too-large');
  if (exponent !== undefined) return { ok: true, value, written: 'exponent', mark };
  return point === ''
    ? { ok: true, value, written, mark }
    : { ok: true, value, written: 'zero-decimal', mark: point as '.' | ',' };
}

/** Groups of three that can be nothing else, or that the file's style says are groups. */
function groupsThousands(body: string, groups: RegExpExecArray, style: NumberStyle): boolean {
  if (style.thousands === 'none' || style.decimal === groups[1]) return false;
  if (style.thousands === groups[1] || style.decimal !== null) return true;
  const several = groups[0].split(groups[1]).length > 2;
  const other = groups[1] === '.' ? ',' : '.';
  return several || body[groups[0].length] === other;
}

function isAmbiguous(
  whole: string,
  point: string,
  decimals: string,
  exponent: string | undefined,
  style: NumberStyle
): boolean {
  if (point === '' || exponent !== undefined || style.decimal === point) return false;
  if (style.thousands !== null) return false;
  // "0.149" and "0123,456" cannot be groups: a first group has one to three digits and no zero in front.
  return decimals.length === 3 && /^[1-9]\d{0,2}$/.test(whole);
}

/** digits · 10^shift if that is whole, else null; Infinity where it is far above 2^53. */
function exactValue(digits: string, shift: number): number | null {
  const significant = digits.replace(/^0+/, '');
  if (significant === '') return 0;
  const zeros = significant.length - significant.replace(/0+$/, '').length;
  if (shift < 0 && -shift > zeros) return null;
  if (significant.length + shift > 16) return Infinity;
  const whole = shift < 0 ? significant.slice(0, shift) : significant + '0'.repeat(shift);
  return BigInt(whole) > 2n ** 53n ? Infinity : Number(whole);
}
