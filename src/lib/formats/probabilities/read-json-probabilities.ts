import { type JsonNode, describe, member } from '../json/node';
import { parseJson } from '../json/parse-json';
import { defaultMaxRows } from '../limits';
import type { ProblemList } from '../problem-list';
import { placeOf } from '../text/place-of';

const expected = 'Give [0.1, 0.2], {"probabilities": [0.1, 0.2]} or {"levels": [{"p": 0.1, "trials": 4}]}.';

/** Largest number of trials in one level, so that a slip does not ask for a list of 10^15. */
const maxTrials = 1_000_000;

/** Probabilities of a JSON text; problems go to the list. */
export function readJsonProbabilities(text: string, problems: ProblemList): number[] {
  const report = (at: number, message: string, fix: string) =>
    problems.add(() => ({ ...placeOf(text, at), message, fix }));
  const parsed = parseJson(text, defaultMaxRows);
  if (!parsed.ok) {
    report(parsed.error.at, parsed.error.message, parsed.error.fix);
    return [];
  }
  const { root } = parsed;
  const holder = member(root, 'fit') ?? root;
  const list = root.kind === 'array' ? root : (member(holder, 'probabilities') ?? member(holder, 'levels'));
  if (list?.kind !== 'array') {
    report(root.at, 'There is no list of probabilities.', expected);
    return [];
  }
  const number = (
    node: JsonNode | null,
    low: number,
    high: number,
    what: string,
    parent: JsonNode
  ): number => {
    const value = node?.kind === 'number' ? Number(node.raw) : NaN;
    if (value >= low && value <= high) return value;
    report(
      (node ?? parent).at,
      `${node ? describe(node) : 'Nothing'} stands where ${what} should.`,
      expected
    );
    return low;
  };
  return list.items.flatMap((item) => {
    if (item.kind !== 'object') return [number(item, 0, 1, 'a probability from 0 to 1', list)];
    const p = number(member(item, 'p'), 0, 1, 'a probability "p" from 0 to 1', item);
    const trials = number(member(item, 'trials'), 0, maxTrials, 'a number "trials"', item);
    if (Number.isInteger(trials)) return Array.from({ length: trials }, () => p);
    report(item.at, `${trials} trials are not a whole number.`, expected);
    return [];
  });
}
