/** A lump label at the start of a line, which holds spaces of its own: "10 or more", ">= 10", "0 - 2". */
const label =
  /^(?:(?:>=|=>|≥|⩾|>|<=|=<|≤|⩽|<)[ \t]*\d+|0[ \t]*(?:-|–|—|to|bis|\.\.|…)[ \t]*\d+|\d+[ \t]*\+|\d+[ \t]+(?:or|and|und|oder|et|ou|y|o|e|of|en|eller|lub|i|и)[ \t]+[\p{L}\p{M}]+)(?=[ \t])/iu;

/**
 * Rewrites a line whose cells stand apart by runs of spaces or tabs, so that single tabs separate
 * them. Quoted cells and a lump label in front keep their spaces.
 */
export function joinSpaced(line: string): string {
  const trimmed = line.replace(/^[ \t]+|[ \t]+$/g, '');
  // Almost all lines hold digits and blanks only.
  if (/^[\d \t]*$/.test(trimmed)) return trimmed.replace(/[ \t]+/g, '\t');
  const lump = label.exec(trimmed);
  const rest = lump ? trimmed.slice(lump[0].length) : trimmed;
  const joined = rest.replace(/("[^"]*")|[ \t]+/g, (_, quoted: string | undefined) => quoted ?? '\t');
  return lump ? lump[0].replace(/[ \t]+/g, ' ') + joined : joined;
}
