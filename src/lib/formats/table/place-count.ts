import { type NamedDraft, sayWhich } from './named-draft';

/**
 * Finds the count among named columns: a word for what is counted, else a symbol ("n", "value"),
 * else "count" and its like, else the only column of numbers that is left.
 *
 * Where two columns may be the count the file is refused: a wrong one would give an answer about
 * something else.
 */
export function placeCount({ draft, freeOf, format, word }: NamedDraft): void {
  if (draft.has('count')) return;
  const strong = freeOf('count');
  const symbols = freeOf('symbol');
  const either = freeOf('either');
  const unknown = freeOf('unknown').filter((column) => draft.isNumeric(column));
  const likely = strong.length > 0 ? strong : [...symbols, ...either];
  // Without a number of shots and a shot number, one of two such columns is the number of shots.
  const list = format === 'shots' || freeOf('shot').length > 0;
  const spare = draft.has('frequency') || list ? 0 : 1;
  const most = strong.length > 0 ? 1 : 1 + spare;
  if (likely.length > most || (strong.length > 0 && symbols.length + either.length > 1)) {
    const named = (strong.length > 1 ? strong : [...strong, ...symbols, ...either]).map((column) =>
      draft.label(column)
    );
    draft.refuse(`It cannot be told which is the count: ${named.join(' or ')}.`, sayWhich);
  } else if (strong.length === 1) draft.set(strong[0], 'count', word(strong[0]));
  else if (symbols.length > 0) draft.set(symbols[0], 'count', word(symbols[0]));
  else if (either.length > 0) {
    const pair = draft.sheet.width === 2 && spare === 1 && unknown.length === 1 && !draft.has('batch');
    if (pair && unknown[0] < either[0]) draft.set(unknown[0], 'count', 'it stands before the number');
    else draft.set(either[0], 'count', word(either[0]));
  } else if (unknown.length === 1) draft.set(unknown[0], 'count', 'no other column can be the count');
  else if (unknown.length === 2 && draft.sheet.width === 2) {
    draft.set(unknown[0], 'count', 'the names are not known: the count comes first');
  } else {
    const numbers = freeOf('shot', 'trials');
    if (draft.has('frequency') && numbers.length === 1) {
      draft.set(numbers[0], 'count', 'no other column can be the count');
    } else draft.refuse(`No column is known to be the count (${draft.sheet.names.join(', ')}).`, sayWhich);
  }
}
