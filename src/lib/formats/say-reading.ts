import type { ColumnReading, FormatId, Reading, Role } from './types';

const forms: Record<FormatId, string> = {
  counts: 'a table of counts',
  shots: 'a shot list',
  positions: 'numbers of shots for 0, 1, 2 … defects',
  json: 'JSON'
};

const marks = { comma: 'commas', semicolon: 'semicolons', tab: 'tabs', spaces: 'spaces' };

const roles: Record<Role, string> = {
  count: 'the count',
  frequency: 'the number of shots',
  shot: 'the shot number',
  batch: 'the batch',
  condition: 'a condition',
  ignored: 'not used'
};

/**
 * How a file was understood, in sentences: the format, what separates the cells, what each column
 * holds and why, and everything else that was guessed and is not the usual.
 */
export function sayReading(reading: Reading): string[] {
  const { format, separator, header, columns, encoding, decimal, thousands, lump, below } = reading;
  const sentences: string[] = [];
  if (format) {
    const between =
      separator && separator.value !== 'none' ? `, cells apart by ${marks[separator.value]}` : '';
    const names = header?.value ? ', names in the first row' : '';
    sentences.push(`Read as ${forms[format.value]}${between}${names} (${format.why}).`);
  }
  for (const column of columns) sentences.push(sayColumn(column));
  if (below) sentences.push(`Line ${below.line} is read as "${below.to} or fewer".`);
  if (lump) sentences.push(`Line ${lump.line} is read as "${lump.from} or more".`);
  if (decimal && decimal.value === ',') sentences.push('Commas are read as decimal marks.');
  if (thousands && thousands.value !== 'none') {
    sentences.push(
      `Digits are grouped by ${thousands.value === ',' ? 'commas' : thousands.value === '.' ? 'points' : `${thousands.value}s`}.`
    );
  }
  if (encoding && encoding.value !== 'utf-8')
    sentences.push(`The encoding is ${encoding.value} (${encoding.why}).`);
  return sentences;
}

function sayColumn({ column, name, role }: ColumnReading): string {
  const called = name === null ? `Column ${column}` : `Column "${name}"`;
  return `${called} is ${roles[role.value]} (${role.why}).`;
}
