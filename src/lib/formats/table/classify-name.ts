import { anyWord, wholeNames, wordClasses } from './header-words';
import { normaliseName } from './normalise-name';

/**
 * What a column name says by itself. `either` may be the count or the number of shots ("count",
 * "Anzahl"); `symbol` is a short name that more likely is the count ("n", "value"); `run` may
 * number shots or batches; `trials` is a condition that suggests N; `share` cannot be used as a
 * number of shots.
 */
export type NameClass = (typeof wordClasses)[number] | 'symbol' | 'unknown';

const whole = new Map<string, NameClass>();
for (const [key, names] of Object.entries(wholeNames)) {
  for (const name of names) whole.set(normaliseName(name), key as NameClass);
}
const words = new Map<string, NameClass>();
// From last to first, so that a word in two lists belongs to the one that is asked first.
for (const key of [...wordClasses].reverse()) {
  for (const word of anyWord[key]) words.set(normaliseName(word), key);
}

const unspaced = /[\p{Script=Han}\p{Script=Hiragana}\p{Script=Katakana}\p{Script=Hangul}]/u;

/** Classifies a column name by the word lists; `unknown` when no word of it is known. */
export function classifyName(name: string): NameClass {
  const normal = normaliseName(name);
  const exact = whole.get(normal);
  if (exact) return exact;
  const found = new Set(normal.split(' ').map((word) => words.get(word)));
  // Chinese, Japanese and Korean names run words together.
  if (unspaced.test(normal)) {
    for (const [word, key] of words) if (unspaced.test(word) && normal.includes(word)) found.add(key);
  }
  return wordClasses.find((key) => found.has(key)) ?? 'unknown';
}
