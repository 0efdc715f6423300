import type { DecimalMark } from '../types';

export type DecimalDecision =
  { ok: true; decimal: DecimalMark } | { ok: false; at: number; message: string; fix: string };

/**
 * Decides whether commas in a list of probabilities separate them or start decimals.
 *
 * They separate when a decimal point stands somewhere, or a space behind a comma; they are decimal
 * marks when semicolons separate, or when reading them as separators would give a value above 1
 * ("0,25"). A list such as "0,1 0,1" is neither, and is refused.
 */
export function decideDecimal(text: string, given?: DecimalMark): DecimalDecision {
  if (given) return { ok: true, decimal: given };
  const comma = text.search(/\d,\d/);
  if (comma === -1 || /\d\.|\.\d/.test(text) || /,\s/.test(text)) return { ok: true, decimal: '.' };
  const tokens = text.split(/[\s;]+/).filter((token) => token !== '');
  const decimals = tokens.every((token) => /^(0|1|0,\d+|1,0+|\d,\d+e-\d+)$/i.test(token));
  if (!decimals) return { ok: true, decimal: '.' };
  const tooLarge = text.split(/[\s;,]+/).some((token) => Number(token) > 1);
  if (text.includes(';') || tooLarge) return { ok: true, decimal: ',' };
  return {
    ok: false,
    at: comma,
    message: 'The commas can be read two ways: between probabilities, or as decimal marks.',
    fix: 'Write decimals with a point, or separate the probabilities by semicolons.'
  };
}
