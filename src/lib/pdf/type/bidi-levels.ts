/** Letters of scripts that run to the left. */
export const RIGHT = /[\p{sc=Hebrew}\p{sc=Arabic}\p{sc=Syriac}\p{sc=Thaana}\p{sc=Nko}]/u;

const PAIRS: Record<string, string> = { '(': ')', '[': ']', '{': '}' };

type Kind = 'left' | 'right' | 'number' | 'between';

/**
 * Level of each sign of a line: 0 for what runs to the right in a line that does, 1 for what runs to the left, 2 for
 * numbers and latin inside that. Rules W, N and I of Unicode Standard Annex 9, without embeddings.
 *
 * @param base 1 when the paragraph reads from the right, else 0
 */
export function levelsOf(signs: string[], base: 0 | 1): number[] {
  const kinds = resolveBrackets(signs, kindsOf(signs, base), base);
  const side = (kind: Kind | undefined): 'left' | 'right' =>
    kind === undefined ? (base === 1 ? 'right' : 'left') : kind === 'left' ? 'left' : 'right';
  return kinds.map((kind, i) => {
    if (kind === 'right') return 1;
    if (kind === 'left') return base === 1 ? 2 : 0;
    if (kind === 'number') return 2;
    const before = side(kinds.slice(0, i).findLast((k) => k !== 'between'));
    const after = side(kinds.slice(i + 1).find((k) => k !== 'between'));
    if (before !== after) return base;
    return before === 'right' ? 1 : base === 1 ? 2 : 0;
  });
}

function kindsOf(signs: string[], base: 0 | 1): Kind[] {
  let strong: Kind = base === 1 ? 'right' : 'left';
  return signs.map((sign, i): Kind => {
    if (RIGHT.test(sign)) return (strong = 'right');
    const neighbours = [signs[i - 1] ?? '', signs[i + 1] ?? ''];
    const within = /[.,:/\u202f\u00a0]/.test(sign) && neighbours.every((near) => /\p{Nd}/u.test(near));
    // A number after latin letters belongs to them.
    if (within || /\p{Nd}/u.test(sign)) return strong === 'left' ? 'left' : 'number';
    return /\p{L}/u.test(sign) ? (strong = 'left') : 'between';
  });
}

/** Rule N0: both brackets of a pair go with what stands inside, or with what stands before. */
function resolveBrackets(signs: string[], kinds: Kind[], base: 0 | 1): Kind[] {
  const resolved = [...kinds];
  const [along, against]: Kind[] = base === 1 ? ['right', 'left'] : ['left', 'right'];
  const strongOf = (kind: Kind): Kind => (kind === 'number' ? 'right' : kind);
  signs.forEach((sign, open) => {
    const close = PAIRS[sign] === undefined ? -1 : signs.indexOf(PAIRS[sign], open);
    if (close < 0) return;
    const inside = resolved.slice(open + 1, close).map(strongOf);
    const before = resolved.slice(0, open).findLast((kind) => kind !== 'between');
    const side = inside.includes(along)
      ? along
      : inside.includes(against)
        ? before !== undefined && strongOf(before) === against
          ? against
          : along
        : null;
    if (side !== null) resolved[open] = resolved[close] = side;
  });
  return resolved;
}
