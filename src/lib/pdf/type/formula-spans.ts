import type { Span } from './break-lines';
import type { Style } from './styles';

/** Words in formulas that are no products of letters. */
const UPRIGHT = new Set(['ln', 'sup', 'exp', 'Bin', 'P']);

/**
 * A formula such as "Σ_n (h_n/S) ln" as spans: _ lowers and ^ raises what follows, a sign or a {group}; single latin
 * letters lean, words and Greek stand.
 */
export function formulaSpans(formula: string, style: Style): Span[] {
  const lowered = { ...style, size: style.size * 0.72, rise: -style.size * 0.22 };
  const raised = { ...style, size: style.size * 0.72, rise: style.size * 0.38 };
  const spans: Span[] = [];
  for (const [, shift, group, sign, plain] of formula.matchAll(/([_^])(?:\{([^}]*)\}|(.))|([^_^]+)/gu)) {
    const look = shift === '_' ? lowered : shift === '^' ? raised : style;
    spans.push(...leaning(group ?? sign ?? plain, look));
  }
  return spans;
}

function leaning(text: string, style: Style): Span[] {
  const italic: Style = { ...style, face: 'italic' };
  return (text.match(/[A-Za-z]+|[^A-Za-z]+/g) ?? []).map((part) => ({
    text: part,
    style: /[A-Za-z]/.test(part) && !UPRIGHT.has(part) ? italic : style
  }));
}
