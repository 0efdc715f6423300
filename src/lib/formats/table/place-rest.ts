import { type NamedDraft, sayWhich } from './named-draft';

/**
 * Gives the named columns that are left their roles: shares are not used, the rest are conditions.
 *
 * Without a number of shots a column of numbers may be one under another name; where the rows would
 * make a histogram with it, the file is refused and the person asked. A condition of a shot list
 * that differs on every row would make datasets of one shot: it marks the shots instead (a time).
 */
export function placeRest(named: NamedDraft): void {
  const { draft, classes, freeOf, format, word } = named;
  const shares = freeOf('share');
  for (const column of shares) draft.set(column, 'ignored', `${word(column)}: not a number of shots`);
  for (const column of freeOf('condition')) draft.set(column, 'condition', word(column));
  if (!draft.has('frequency') && !draft.has('shot') && format !== 'shots') {
    if (shares.length > 0) {
      draft.refuse(
        `The ${draft.label(shares[0])} holds shares, and no column the numbers of shots.`,
        'Give numbers of shots: how much can be told depends on them, and shares do not show them.'
      );
    }
    placeUnnamedFrequency(named);
  }
  for (const column of draft.free()) {
    draft.set(
      column,
      'condition',
      classes[column] === 'unknown' ? 'a named column beside the count' : word(column)
    );
  }
  const list = !draft.has('frequency') && !draft.has('shot') && draft.sheet.rows.length > 1;
  const columns = [...draft.roles.keys()];
  for (const column of columns) {
    const decided = draft.roles[column];
    if (!decided || decided.from === 'given') continue;
    if (decided.value === 'batch' && draft.has('frequency')) {
      draft.set(column, 'condition', 'a batch with numbers of shots is a dataset of its own');
    } else if (decided.value === 'condition' && list && !draft.has('shot') && draft.isDistinct([column])) {
      draft.set(column, 'shot', 'every row has another value, so it marks the shots');
    }
  }
}

/** A number of shots under an unknown name, or the refusal when that cannot be told. */
function placeUnnamedFrequency({ draft, classes }: NamedDraft): void {
  const numbers = draft.free().filter((column) => draft.isNumeric(column));
  if (numbers.length === 1 && draft.sheet.width === 2 && classes[numbers[0]] === 'unknown') {
    draft.set(numbers[0], 'frequency', 'the other column is the count');
    return;
  }
  const others = [...draft.roles.keys()].filter((column) => {
    const role = draft.roles[column]?.value;
    return role === undefined || role === 'condition' || role === 'count';
  });
  const doubtful = numbers.find((column) => draft.isDistinct(others.filter((other) => other !== column)));
  if (doubtful !== undefined) {
    draft.refuse(
      `It cannot be told whether ${draft.label(doubtful)} is the number of shots or a condition.`,
      sayWhich
    );
  }
}
