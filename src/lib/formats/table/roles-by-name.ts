import type { FormatId } from '../types';
import { classifyName } from './classify-name';
import { type NamedDraft, sayWhich } from './named-draft';
import { placeCount } from './place-count';
import { placeRest } from './place-rest';
import type { RoleDraft } from './role-draft';

/**
 * Decides the roles of named columns: words first, then what is left over.
 *
 * Where the words leave two readings that would change the numbers the file is refused and the
 * person asked; where one reading is usual ("value, count": the second is the number of shots) it
 * is taken and reported.
 */
export function rolesByName(draft: RoleDraft, format: FormatId | 'auto'): void {
  const classes = draft.sheet.names.map((name) => (name ? classifyName(name) : 'unknown'));
  const freeOf: NamedDraft['freeOf'] = (...wanted) =>
    draft.free().filter((column) => wanted.includes(classes[column]));
  const word: NamedDraft['word'] = (column) => `its name, "${draft.sheet.names[column]}"`;
  const named: NamedDraft = { draft, classes, format, freeOf, word };

  for (const column of freeOf('batch')) draft.set(column, 'batch', word(column));
  for (const column of freeOf('remark')) draft.set(column, 'ignored', word(column));
  placeFrequency(named);
  if (draft.problem) return;
  if (format === 'positions') return placePositions(draft);
  placeCount(named);
  if (draft.problem) return;
  placeShotNumber(named);
  placeRest(named);
}

function placeFrequency({ draft, freeOf, format, word }: NamedDraft): void {
  const columns = freeOf('frequency');
  if (columns.length === 0 || draft.has('frequency')) return;
  if (columns.length > 1) {
    draft.refuse(
      `Both ${columns.map((column) => draft.label(column)).join(' and ')} may be the number of shots.`,
      sayWhich
    );
  } else if (format === 'shots') {
    if (draft.sheet.width > 1) draft.set(columns[0], 'shot', `${word(columns[0])}, in a shot list`);
  } else if (draft.sheet.width > 1 || format === 'positions') {
    draft.set(columns[0], 'frequency', word(columns[0]));
  } else {
    draft.refuse(
      `The only column is called "${draft.sheet.names[0]}", so it holds numbers of shots, but not for which counts.`,
      'Add a column with the counts; or say that the lines stand for 0, 1, 2 … defects (positions), or are one count a line (shots).'
    );
  }
}

function placePositions(draft: RoleDraft): void {
  const free = draft.free();
  if (!draft.has('frequency') && free.length === 1) draft.set(free[0], 'frequency', 'the only column');
  for (const column of draft.free()) draft.set(column, 'ignored', 'positions have one column');
  if (!draft.has('frequency'))
    draft.refuse('It cannot be told which column holds the numbers of shots.', sayWhich);
}

function placeShotNumber({ draft, freeOf, format, word }: NamedDraft): void {
  const frequency = draft.has('frequency');
  for (const column of freeOf('shot')) {
    if (frequency || draft.has('shot'))
      draft.set(column, 'ignored', `${word(column)}, beside a number of shots`);
    else draft.set(column, 'shot', word(column));
  }
  for (const column of freeOf('run')) {
    if (frequency) draft.set(column, 'condition', word(column));
    else if (!draft.has('shot') && draft.isDistinct([column]))
      draft.set(column, 'shot', `${word(column)}, and every line has another`);
    else if (!draft.has('batch')) draft.set(column, 'batch', `${word(column)}, and values repeat`);
    else draft.set(column, 'condition', word(column));
  }
  if (!frequency && !draft.has('shot') && format !== 'shots') {
    const [number] = freeOf('symbol', 'either');
    if (number !== undefined) draft.set(number, 'frequency', `${word(number)}, beside the count`);
  }
}
