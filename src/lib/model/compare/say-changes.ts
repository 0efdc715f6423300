import { VERDICTS } from '$lib/model/labels';
import type { Comparable, ComparedPart } from './compared';

const list = (names: string[]): string =>
  names.length < 2 ? (names[0] ?? '') : `${names.slice(0, -1).join(', ')} and ${names[names.length - 1]}`;

/** What changed between two results and what could be behind it, in sentences. */
export function sayChanges(first: Comparable, second: Comparable, parts: ComparedPart[]): string[] {
  const [before, after] = [first.document, second.document];
  const changed = (id: ComparedPart['id']): string[] =>
    parts
      .find((part) => part.id === id)
      ?.lines.flatMap((line) => (line.changed && !line.slight ? [line.name] : [])) ?? [];
  const sentences: string[] = [];
  sentences.push(
    before.answer.verdict === after.answer.verdict
      ? `Both give the same answer: ${VERDICTS[after.answer.verdict].toLowerCase()}.`
      : `The answer changed: from “${VERDICTS[before.answer.verdict].toLowerCase()}” to “${VERDICTS[after.answer.verdict].toLowerCase()}”.`
  );
  if (before.data.digest !== after.data.digest || before.data.shots !== after.data.shots)
    sentences.push('The two were computed from different counts: their numbers need not agree.');
  const options = changed('options');
  const versions = before.engine.version !== after.engine.version;
  if (options.length) sentences.push(`Asked for differently: ${list(options)}.`);
  if (versions)
    sentences.push(
      `Computed by different engines: Severalty ${before.engine.version} and ${after.engine.version}.`
    );
  if (options.length === 1 && options[0] === 'Seed' && !versions)
    sentences.push('Only the random draws differ: how far the p-values moved is how far chance moves them.');
  const results = parts.filter(({ id }) => !['options', 'engine', 'data'].includes(id));
  if (results.every(({ changes }) => changes === 0))
    sentences.push('No number of the result changed by more than rounding.');
  return sentences;
}
