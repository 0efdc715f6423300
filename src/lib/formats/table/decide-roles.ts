import type { ColumnReading, FormatId, Guess, Problem, ReadOptions, Role } from '../types';
import { RoleDraft } from './role-draft';
import { rolesByName } from './roles-by-name';
import { rolesByPosition } from './roles-by-position';
import type { Sheet } from './sheet';

/** Roles of all columns and the format that follows from them, or the reason why there are none. */
export type RoleDecision =
  | { ok: true; columns: ColumnReading[]; format: Guess<FormatId> }
  | { ok: false; columns: ColumnReading[]; problem: Problem };

const single: Role[] = ['count', 'frequency', 'shot'];

/** Decides what each column holds: what the person said, then names, then positions. */
export function decideRoles(sheet: Sheet, options: ReadOptions): RoleDecision {
  const draft = new RoleDraft(sheet);
  const asked = options.format ?? 'auto';
  for (const { column, role } of options.columns ?? []) {
    const index = draft.lookUp(column);
    if (index === -1) {
      const known = sheet.names.some((name) => name !== null) ? ` (${sheet.names.join(', ')})` : '';
      draft.refuse(
        `There is no column "${column}" among the ${sheet.width}${known}.`,
        'Name a column of the file, or give its number.'
      );
    } else if (single.includes(role) && draft.has(role) && draft.find(role) !== index) {
      draft.refuse(
        `Two columns are said to be the ${role === 'frequency' ? 'number of shots' : role}.`,
        'Name one.'
      );
    } else draft.set(index, role, 'as you said', 'given');
  }
  if (!draft.problem) {
    if (sheet.names.some((name) => name !== null)) rolesByName(draft, asked);
    else rolesByPosition(draft, asked);
  }
  if (!draft.problem) checkFormat(draft, asked);
  const columns = sheet.names.map((name, index) => ({
    column: index + 1,
    name,
    role: draft.roles[index] ?? { value: 'ignored' as const, from: 'guessed' as const, why: 'not decided' }
  }));
  if (draft.problem) return { ok: false, columns, problem: draft.problem };
  return { ok: true, columns, format: formatOf(draft, asked) };
}

function checkFormat(draft: RoleDraft, asked: FormatId | 'auto'): void {
  if (asked === 'positions') {
    if (!draft.has('frequency')) {
      draft.refuse('No column holds the numbers of shots.', 'Say which column holds the numbers of shots.');
    }
    return;
  }
  if (!draft.has('count')) {
    draft.refuse('No column holds the count.', 'Say which column holds the count.');
  } else if (asked === 'counts' && !draft.has('frequency')) {
    draft.refuse(
      'A table of counts needs a column with the numbers of shots, and there is none.',
      'Name that column; or say that the file is a shot list (shots) or numbers of shots by position (positions).'
    );
  } else if (asked === 'shots' && draft.has('frequency')) {
    draft.refuse(
      'A shot list has no column of numbers of shots.',
      'Say that the file is a table of counts (counts).'
    );
  }
}

function formatOf(draft: RoleDraft, asked: FormatId | 'auto'): Guess<FormatId> {
  if (asked !== 'auto') return { value: asked, from: 'given', why: 'as you said' };
  if (draft.has('frequency')) {
    return { value: 'counts', from: 'guessed', why: 'a column of counts and one of numbers of shots' };
  }
  return { value: 'shots', from: 'guessed', why: 'one count a line, and no column of numbers of shots' };
}
