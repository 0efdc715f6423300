import { formatCount, formatNumber } from '$lib/model/format-number';
import type { ColumnKind } from './table';

function numberText(value: number, digits: number): string {
  if (value === 0) return '0';
  const size = Math.abs(value);
  const sign = value < 0 ? '\u2212' : '';
  if (size < 1e-4 || size >= 1e7) return formatNumber(value, digits);
  const text = size >= 10 ** digits ? String(Math.round(size)) : size.toPrecision(digits);
  const [head, part] = text.split('.');
  return `${sign}${head.replace(/\B(?=(\d{3})+$)/g, '\u2009')}${part ? `.${part}` : ''}`;
}

/**
 * Sets one column: `digits` significant digits, and no-break spaces after each number so that the decimal
 * points stand under one another when the column is set flush right in a face of even width.
 */
export function alignedColumn(values: (number | string | null)[], kind: ColumnKind, digits = 4): string[] {
  if (kind === 'text') return values.map((value) => (value === null ? '–' : String(value)));
  const texts = values.map((value) =>
    typeof value === 'number'
      ? kind === 'whole'
        ? formatCount(value)
        : numberText(value, digits)
      : (value ?? '–')
  );
  if (kind === 'whole') return texts;
  const after = (text: string): number => {
    const point = text.indexOf('.');
    return point < 0 ? 0 : text.length - point;
  };
  const most = Math.max(0, ...texts.map(after));
  return texts.map((text) => text + '\u00a0'.repeat(most - after(text)));
}
