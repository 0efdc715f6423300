/** What LaTeX reads as a command, or sets as another sign; the right-hand sides need no package. */
const SPECIALS: Record<string, string> = {
  '\\': '\\textbackslash{}',
  // BibTeX counts braces without minding a backslash before them, so \{ would upset an entry.
  '{': '\\textbraceleft{}',
  '}': '\\textbraceright{}',
  '#': '\\#',
  $: '\\$',
  '%': '\\%',
  '&': '\\&',
  _: '\\_',
  '~': '\\textasciitilde{}',
  '^': '\\textasciicircum{}',
  // In the classic encoding these three come out as ¡, ¿ and a dash.
  '<': '\\textless{}',
  '>': '\\textgreater{}',
  '|': '\\textbar{}',
  '`': '\\`{}',
  '"': "''",
  '\u2013': '--',
  '\u2014': '---',
  '\u2018': '`',
  '\u2019': "'",
  '\u201c': '``',
  '\u201d': "''",
  '\u00a0': '~',
  '\u202f': '\\,',
  '\u2009': '\\,',
  '\u2212': '$-$',
  '×': '$\\times$',
  '≤': '$\\le$',
  '≥': '$\\ge$',
  '…': '\\dots{}'
};

const RAISED = '⁰¹²³⁴⁵⁶⁷⁸⁹⁻';
const LEVEL = '0123456789-';

/**
 * Text that LaTeX sets as it stands: every special sign escaped, typographic signs in LaTeX's own spelling, letters of
 * any script left as they are. Needs nothing beyond a standard class; scripts other than Latin want an engine that
 * knows them.
 *
 * @param typed true for what people typed: signs that LaTeX would join are then kept apart ("--", "''")
 */
export function escapeLatex(text: string, typed = true): string {
  let escaped = '';
  for (const part of text.match(/-{2,}|'{2,}|,{2,}|[⁰¹²³⁴⁵⁶⁷⁸⁹⁻]+|[\s\S]/gu) ?? []) {
    const set = escapedPart(part, typed);
    // A typed dash beside a hyphen would be set as a longer dash, a closing quote beside another as a double one.
    const joins = typed && /[-'`]$/.test(escaped) && escaped.at(-1) === set[0];
    escaped += joins ? `{}${set}` : set;
  }
  // ?` and !` would be set as ¿ and ¡.
  return escaped.replace(/([?!])`/g, '$1{}`');
}

function escapedPart(part: string, typed: boolean): string {
  if (RAISED.includes(part[0])) return `$^{${[...part].map((c) => LEVEL[RAISED.indexOf(c)]).join('')}}$`;
  if (part.length > 1 && /^[-',]/.test(part)) return typed ? [...part].join('{}') : part;
  return SPECIALS[part] ?? part;
}
