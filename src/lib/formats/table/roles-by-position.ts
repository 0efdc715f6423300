import type { FormatId } from '../types';
import type { RoleDraft } from './role-draft';

const sayWhich =
  'Give the columns names in a first line (such as device, count, shots), or say which column holds the count and which the number of shots.';

/**
 * Decides the roles of columns without names. One column holds a count a line (or a number of
 * shots a line, when the format says `positions`). Of two columns the first is the count and the
 * second the number of shots. More columns are refused until the person says what they hold.
 */
export function rolesByPosition(draft: RoleDraft, format: FormatId | 'auto'): void {
  const free = draft.free();
  const { width } = draft.sheet;
  if (format === 'positions') {
    if (!draft.has('frequency') && free.length > 0) draft.set(free[0], 'frequency', 'the only column');
    if (draft.free().length > 0) draft.refuse(`There are ${width} columns; this format has one.`, sayWhich);
    return;
  }
  if (width === 1) {
    if (free.length > 0) draft.set(0, 'count', 'one column without a name: one count a line');
    return;
  }
  if (width > 2 && !draft.has('count')) {
    draft.refuse(
      `There are ${width} columns without names, so it cannot be told which is the count.`,
      sayWhich
    );
    return;
  }
  if (format === 'shots') {
    if (!draft.has('count')) draft.set(free[free.length - 1], 'count', 'the last column of a shot list');
    for (const column of draft.free()) {
      const shot = !draft.has('shot') && draft.isDistinct([column]);
      if (shot) draft.set(column, 'shot', 'every line has another value');
      else if (!draft.has('batch')) draft.set(column, 'batch', 'values repeat');
      else draft.set(column, 'condition', 'a further column');
    }
    return;
  }
  if (!draft.has('count')) {
    const [column] = free;
    if (column !== undefined) draft.set(column, 'count', 'columns without names: the count comes first');
  }
  const rest = draft.free();
  if (draft.has('frequency') || draft.has('shot')) {
    for (const column of rest) draft.set(column, 'condition', 'a further column');
  } else if (rest.length === 1) {
    draft.set(rest[0], 'frequency', 'columns without names: the number of shots comes second');
  } else if (rest.length > 1)
    draft.refuse('It cannot be told which column holds the number of shots.', sayWhich);
}
