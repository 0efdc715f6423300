import { formats } from './registry';
import type { DecimalMark, Encoding, FormatId, ReadOptions, Role, Separator, ThousandsMark } from './types';

/** A value a guess can be changed to, in words. */
export interface Choice<T> {
  value: T;
  label: string;
}

/**
 * What each guess of a `Reading` can be changed to: the page fills its lists from here and puts the
 * chosen value into `ReadOptions`; the command line has one option for each.
 */
export const choices: {
  format: Choice<FormatId>[];
  encoding: Choice<Encoding>[];
  separator: Choice<Separator>[];
  header: Choice<boolean>[];
  role: Choice<Role>[];
  decimal: Choice<DecimalMark>[];
  thousands: Choice<ThousandsMark>[];
} = {
  format: formats.map(({ id, label }) => ({ value: id, label })),
  encoding: [
    { value: 'utf-8', label: 'UTF-8' },
    { value: 'windows-1252', label: 'Windows (Western Europe)' },
    { value: 'utf-16le', label: 'UTF-16, little end first' },
    { value: 'utf-16be', label: 'UTF-16, big end first' }
  ],
  separator: [
    { value: 'comma', label: 'commas' },
    { value: 'semicolon', label: 'semicolons' },
    { value: 'tab', label: 'tabs' },
    { value: 'spaces', label: 'spaces' },
    { value: 'none', label: 'nothing: one column' }
  ],
  header: [
    { value: true, label: 'the first row holds names' },
    { value: false, label: 'the first row holds numbers' }
  ],
  role: [
    { value: 'count', label: 'count' },
    { value: 'frequency', label: 'number of shots' },
    { value: 'shot', label: 'shot number' },
    { value: 'batch', label: 'batch' },
    { value: 'condition', label: 'condition (one dataset for each value)' },
    { value: 'ignored', label: 'not used' }
  ],
  decimal: [
    { value: '.', label: 'point' },
    { value: ',', label: 'comma' }
  ],
  thousands: [
    { value: 'none', label: 'nothing' },
    { value: ',', label: 'comma' },
    { value: '.', label: 'point' }
  ]
};

/**
 * Options with the role of one column changed; what was said of other columns stays, except that a
 * role which only one column can have moves.
 */
export function withRole(options: ReadOptions, column: number, role: Role): ReadOptions {
  const single = role === 'count' || role === 'frequency' || role === 'shot';
  const others = (options.columns ?? []).filter(
    (entry) => entry.column !== column && !(single && entry.role === role)
  );
  return { ...options, columns: [...others, { column, role }] };
}
