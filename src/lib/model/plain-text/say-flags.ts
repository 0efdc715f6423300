import type { Flag } from '$lib/stats/types';
import { FLAGS } from '../labels';
import { wrap } from './wrap';

/** Each flag with its size, its other causes and what would tell them apart. */
export function sayFlags(flags: Flag[]): string {
  if (flags.length === 0) return 'Flags\n  None.';
  const list = (title: string, entries: string[]) =>
    entries.length === 0 ? [] : [`    ${title}`, ...entries.map((entry) => wrap(entry, '      – '))];
  return [
    'Flags',
    ...flags.flatMap((flag) => [
      wrap(`${FLAGS[flag.id]}, ${flag.grade}. ${flag.statement}`, '  ', '    '),
      ...(flag.size === '' ? [] : [wrap(flag.size, '    ')]),
      ...list('Could also come from', flag.otherCauses),
      ...list('What would tell', flag.next)
    ])
  ].join('\n');
}
