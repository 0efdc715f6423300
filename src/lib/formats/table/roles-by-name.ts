import type { FormatId } from '../types';
import { classifyName, type NameClass } from './classify-name';
import type { RoleDraft } from './role-draft';

const sayWhich = 'Say which column holds the count and which the number of shots.';

/**
 * Decides the roles of named columns: words first, then what is left over.
 *
 * Where the words leave two readings that would change the numbers the file is refused and the
 * person asked; where one reading is usual ("value, count": the second is the number of shots) it
 * is taken and reported.
 */
export function rolesByName(draft: RoleDraft, format: FormatId | 'auto'): void {
  const classes = draft.sheet.names.map((name) => (name ? classifyName(name) : 'unknown'));
  const freeOf = (...wanted: NameClass[]) =>
    draft.free().filter((column) => wanted.includes(classes[column]));
  const word = (column: number) => `its name, "${draft.sheet.names[column]}"`;

  for (const column of freeOf('batch')) draft.set(column, 'batch', word(column));
  for (const column of freeOf('remark')) draft.set(column, 'ignored', word(column));
  placeFrequency(draft, freeOf('frequency'), format, word);
  if (draft.problem) return;
  if (format === 'positions') return placePositions(draft);

  placeCount(draft, freeOf, word);
  if (draft.problem) return;
  placeShotNumber(draft, freeOf, format, word);
  placeRest(draft, classes, freeOf, format, word);
}

type FreeOf = (...wanted: NameClass[]) => number[];
type Word = (column: number) => string;

function placeFrequency(draft: RoleDraft, columns: number[], format: FormatId | 'auto', word: Word): void {
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

function placeCount(draft: RoleDraft, freeOf: FreeOf, word: Word): void {
  if (draft.has('count')) return;
  const [strong, symbols, either, unknown] = [
    freeOf('count'),
    freeOf('symbol'),
    freeOf('either'),
    freeOf('unknown').filter((column) => draft.isNumeric(column))
  ];
  if (strong.length > 1) {
    draft.refuse(
      `Both ${strong.map((column) => draft.label(column)).join(' and ')} may be the count.`,
      sayWhich
    );
  } else if (strong.length === 1) draft.set(strong[0], 'count', word(strong[0]));
  else if (symbols.length > 0) draft.set(symbols[0], 'count', word(symbols[0]));
  else if (either.length > 0) {
    const beside =
      draft.sheet.width === 2 && !draft.has('frequency') && unknown.length === 1 && !draft.has('batch');
    if (beside && unknown[0] < either[0]) draft.set(unknown[0], 'count', 'it stands before the number');
    else draft.set(either[0], 'count', word(either[0]));
  } else if (unknown.length === 1) draft.set(unknown[0], 'count', 'no other column can be the count');
  else if (unknown.length === 2 && draft.sheet.width === 2) {
    draft.set(unknown[0], 'count', 'the names are not known: the count comes first');
  } else {
    const numbers = freeOf('shot', 'trials');
    if (draft.has('frequency') && numbers.length === 1)
      draft.set(numbers[0], 'count', 'no other column can be the count');
    else draft.refuse(`No column is known to be the count (${draft.sheet.names.join(', ')}).`, sayWhich);
  }
}

function placeShotNumber(draft: RoleDraft, freeOf: FreeOf, format: FormatId | 'auto', word: Word): void {
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

function placeRest(
  draft: RoleDraft,
  classes: NameClass[],
  freeOf: FreeOf,
  format: FormatId | 'auto',
  word: Word
): void {
  const count = draft.find('count');
  const shares = freeOf('share');
  for (const column of shares) draft.set(column, 'ignored', `${word(column)}: not a number of shots`);
  for (const column of freeOf('condition')) draft.set(column, 'condition', word(column));
  if (!draft.has('frequency') && !draft.has('shot') && format !== 'shots') {
    if (shares.length > 0) {
      draft.refuse(
        `${draft.label(shares[0]).replace('c', 'C')} holds shares, and no column the numbers of shots.`,
        'Give numbers of shots: how many shots can be told from the data, not from shares.'
      );
    }
    const numbers = draft.free().filter((column) => draft.isNumeric(column));
    const keys = [...draft.roles.keys()].filter((column) => draft.roles[column]?.value === 'condition');
    if (numbers.length === 1 && draft.sheet.width === 2 && classes[numbers[0]] === 'unknown') {
      draft.set(numbers[0], 'frequency', 'the other column is the count');
    } else if (numbers.length === 1 && draft.isDistinct([...keys, count])) {
      draft.refuse(
        `It cannot be told whether ${draft.label(numbers[0])} is the number of shots or a condition.`,
        sayWhich
      );
    }
  }
  for (const column of draft.free()) {
    draft.set(
      column,
      'condition',
      classes[column] === 'unknown' ? 'a named column beside the count' : word(column)
    );
  }
  if (draft.has('frequency') && draft.has('batch')) {
    draft.set(draft.find('batch'), 'condition', 'a batch with numbers of shots is a dataset of its own');
  }
}
