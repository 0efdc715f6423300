import { levelsOf, RIGHT } from './bidi-levels';

const MIRRORED: Record<string, string> = {
  '(': ')',
  ')': '(',
  '[': ']',
  ']': '[',
  '{': '}',
  '}': '{',
  '<': '>',
  '>': '<',
  '«': '»',
  '»': '«'
};

/** Whether a text is to be read from the right: its first letter says so. */
export function readsFromRight(text: string): boolean {
  const first = text.match(/\p{L}/u);
  return first !== null && RIGHT.test(first[0]);
}

/**
 * One line in the order in which it stands on paper, as pieces to be set from left to right. A piece of a script
 * that runs to the left keeps its own order: the font's layout turns it round. A simple form of the bidirectional
 * algorithm (Unicode Standard Annex 9): letters, numbers and what stands between them, without embeddings.
 *
 * @param fromRight whether the paragraph reads from the right
 */
export function visualOrder(line: string, fromRight: boolean): string[] {
  if (!RIGHT.test(line)) return [line];
  const signs = line.match(/\P{M}\p{M}*|\p{M}+/gu) ?? [];
  const base = fromRight ? 1 : 0;
  const levels = levelsOf(signs, base);
  const runs: { level: number; signs: string[] }[] = [];
  signs.forEach((sign, i) => {
    const last = runs.at(-1);
    if (last?.level === levels[i]) last.signs.push(sign);
    else runs.push({ level: levels[i], signs: [sign] });
  });
  for (let level = 2; level > 0; level--) {
    for (let i = 0; i < runs.length; i++) {
      let end = i;
      while (end < runs.length && runs[end].level >= level) end++;
      if (end > i + 1) runs.splice(i, end - i, ...runs.slice(i, end).reverse());
      i = end;
    }
  }
  return runs.flatMap((run) => (run.level === 1 ? turned(run.signs) : [run.signs.join('')]));
}

/** Pieces of a run to the left, last first; what stands between the words is turned sign by sign. */
function turned(signs: string[]): string[] {
  const pieces: string[] = [];
  let word = '';
  for (const sign of signs) {
    if (RIGHT.test(sign)) word += sign;
    else {
      if (word) pieces.push(word);
      word = '';
      pieces.push(MIRRORED[sign] ?? sign);
    }
  }
  if (word) pieces.push(word);
  return pieces.reverse();
}
