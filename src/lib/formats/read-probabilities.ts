import { decideDecimal } from './probabilities/decide-decimal';
import { readJsonProbabilities } from './probabilities/read-json-probabilities';
import { defaultMaxBytes } from './limits';
import { quote } from './number/say-bad-number';
import { ProblemList } from './problem-list';
import { decode } from './text/decode';
import { placeOf } from './text/place-of';
import { tooLarge } from './too-large';
import type { DecimalMark, Problem } from './types';

/** Longest list: the largest number of trials that is diagnosed. */
export const maxProbabilities = 1_000_000;

export type ProbabilitiesResult =
  | { ok: true; probabilities: number[]; decimal: DecimalMark; notes: string[] }
  | { ok: false; problems: Problem[]; more: number };

/**
 * Reads the list of p_k a person supplies as a law to compare with: one probability for each
 * trial, apart by line ends, spaces, semicolons or commas, with `#` comments and one heading
 * allowed; or JSON, `[0.1, 0.2]`, `{"probabilities": […]}` or `{"levels": [{"p", "trials"}]}` as in
 * the diagnosis document.
 *
 * @param options.decimal settles what a comma means where "0,1" can be read two ways.
 * @returns the probabilities in the order given, or all problems with line and column.
 */
export function readProbabilities(
  input: Uint8Array | string,
  options: { decimal?: DecimalMark; maxBytes?: number } = {}
): ProbabilitiesResult {
  const problems = new ProblemList();
  const notes: string[] = [];
  let decimal: DecimalMark = '.';
  const finish = (probabilities: number[]): ProbabilitiesResult => {
    if (!problems.any && probabilities.length === 0) {
      problems.whole('There are no probabilities.', 'Give one probability for each trial.', 1);
    }
    if (probabilities.length > maxProbabilities) {
      problems.whole(`There are more than ${maxProbabilities} probabilities.`, 'Give one for each trial.');
    }
    return problems.any
      ? { ok: false, problems: problems.kept, more: problems.more }
      : { ok: true, probabilities, decimal, notes };
  };
  const limit = options.maxBytes ?? defaultMaxBytes;
  if (input.length > limit) {
    problems.add(() => tooLarge(input.length, limit));
    return finish([]);
  }
  const decoded = decode(typeof input === 'string' ? new TextEncoder().encode(input) : input);
  if (!decoded.ok) {
    problems.add(() => decoded.problem);
    return finish([]);
  }
  // Comments become spaces of the same length, so that places stay right.
  const text = decoded.text
    .replace(/\r\n?/g, '\n')
    .replace(
      /(^|\n)([^\S\n]*#[^\n]*)/g,
      (_, end: string, comment: string) => end + ' '.repeat(comment.length)
    );
  if (/^\s*[[{]/.test(text)) return finish(readJsonProbabilities(text, problems));
  const heading = findHeading(text);
  // Blanked with its line end; places are therefore looked up in the text itself.
  const body = ' '.repeat(heading.length) + text.slice(heading.length);
  const decided = decideDecimal(body, options.decimal);
  if (!decided.ok) {
    problems.add(() => ({ ...placeOf(text, decided.at), message: decided.message, fix: decided.fix }));
    return finish([]);
  }
  decimal = decided.decimal;
  if (decimal === ',') notes.push('Commas are read as decimal marks (0,1 is one tenth).');
  const probabilities: number[] = [];
  for (const match of body.matchAll(decimal === ',' ? /[^\s;]+/g : /[^\s;,]+/g)) {
    const value = readProbability(match[0], decimal);
    if (typeof value === 'number') probabilities.push(value);
    else problems.add(() => ({ ...placeOf(text, match.index), ...value }));
  }
  return finish(probabilities);
}

/** The first filled line if it is words ("p", "p_k"), with its line end; else nothing. */
function findHeading(text: string): string {
  const found = /^\s*([^\n]*)\n/.exec(text);
  if (!found || !/\p{L}/u.test(found[1])) return '';
  return found[1].split(/[\s;,]+/).some((token) => /^[+-]?[\d.]/.test(token)) ? '' : found[0];
}

function readProbability(token: string, decimal: DecimalMark): number | { message: string; fix: string } {
  const plain = decimal === ',' ? token.replace(',', '.') : token;
  if (!/^\+?(\d+\.?\d*|\.\d+)(e[+-]?\d+)?$/i.test(plain)) {
    return /%$/.test(token)
      ? { message: `${quote(token)} is a percentage.`, fix: 'Give probabilities from 0 to 1.' }
      : {
          message: `${quote(token)} is no probability.`,
          fix: 'Give numbers from 0 to 1, one for each trial.'
        };
  }
  const value = Number(plain);
  if (value <= 1) return value;
  return { message: `${quote(token)} is above 1.`, fix: 'Give one column of probabilities from 0 to 1.' };
}
