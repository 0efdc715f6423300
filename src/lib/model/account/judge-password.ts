import { ZxcvbnFactory } from '@zxcvbn-ts/core';
import { adjacencyGraphs, dictionary } from '@zxcvbn-ts/language-common';
import { HELP, WARNINGS } from './password-words';

/** Fewest and most characters of a new password. */
export const FEWEST = 10;
export const MOST = 128;

/** zxcvbn's scale ends at 4; 3 is 10^8 guesses and more, which argon2id makes dear (Wheeler 2016, USENIX Security). */
const ENOUGH = 3;

/**
 * Characters that are judged: what is strong in them is strong with more behind them. Some strings of 128 take the
 * estimator five seconds, in which a server answers nobody; of 40, a tenth of that at most.
 */
const JUDGED = 40;

export type Judgement = { ok: true; why: string } | { ok: false; why: string };

let estimator: ZxcvbnFactory | null = null;

/**
 * Whether a new password will do: the server decides by it, and the page shows the same words while one types (there it
 * is fetched on first use: the list of common passwords is large).
 *
 * @param about what the person is called: name, address. Their parts count as the first thing that is guessed.
 * @returns with what is weak about it and what would help, in words
 */
export function judgePassword(password: string, about: string[] = []): Judgement {
  const length = [...password].length;
  if (length > MOST) return { ok: false, why: `It is too long: ${MOST} characters are the most.` };
  // Made at the first call: that takes a quarter of a second.
  estimator ??= new ZxcvbnFactory({ dictionary, graphs: adjacencyGraphs, maxLength: JUDGED });
  const known = about
    .flatMap((text) => [text, ...text.split(/[^\p{L}\p{N}]+/u)])
    .filter((word) => word.length > 2);
  const { score, feedback } = estimator.check(password, ['severalty', ...known]);
  const warning = WARNINGS[feedback.warning ?? ''] ?? '';
  const help = feedback.suggestions.map((name) => HELP[name] ?? '');
  if (length < FEWEST)
    return {
      ok: false,
      why: sentence(`It has ${length} of at least ${FEWEST} characters.`, warning, HELP.useWords)
    };
  if (score < ENOUGH) return { ok: false, why: sentence(warning || 'It would be guessed soon.', ...help) };
  return { ok: true, why: 'This password will do.' };
}

const sentence = (...parts: string[]) => [...new Set(parts.filter(Boolean))].join(' ');
