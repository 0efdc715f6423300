import { json } from './json';
import { defaultMaxBytes } from './limits';
import { formats } from './registry';
import { shots } from './shots';
import { Source } from './source';
import { plainSource } from './table/plain-source';
import { decode } from './text/decode';
import { looksLikeMarkup } from './text/looks-like-markup';
import { oneKindOfLineEnd } from './text/one-kind-of-line-end';
import { tooLarge } from './too-large';
import type { Encoding, Guess, Outcome, Problem, ReadOptions, ReadResult } from './types';

/**
 * Reads a file of counts: a table, a shot list or JSON, as described in `types.ts` and the
 * `registry`.
 *
 * @param input the bytes of a file, or text that was typed or pasted.
 * @param options what the person settled; everything else is guessed and said in `reading`.
 * @returns one or more datasets, or every problem found (the first 20 in full) with line, character
 * column and what to do. Never throws on any input.
 */
export function readCounts(input: Uint8Array | string, options: ReadOptions = {}): ReadResult {
  const limit = options.maxBytes ?? defaultMaxBytes;
  if (input.length > limit) {
    return refuse(options, tooLarge(input.length, limit));
  }
  const typed = typeof input === 'string';
  const chosen = typed ? { ...options, encoding: 'utf-8' as const } : options;
  const bytes = typed ? new TextEncoder().encode(input) : input;
  const seen = plainSource(bytes, chosen);
  if (seen) return finishPlain(seen, typed);
  const decoded = decode(bytes, chosen.encoding);
  if (!decoded.ok) return refuse(options, decoded.problem, decoded.encoding);
  const text = oneKindOfLineEnd(decoded.text);
  // Lists in other encodings, or with remarks in other than English words, are plain once they are text.
  const plain = plainSource(new TextEncoder().encode(text), chosen, decoded.encoding);
  if (plain) return finishPlain(plain, typed);
  const source = new Source(text, options);
  source.reading.encoding = typed ? null : decoded.encoding;
  if (looksLikeMarkup(text)) {
    source.problems.whole(
      'This is a web page or an XML file, not a table.',
      'Copy the table out of it and paste the cells.',
      1
    );
    return finish(source, { datasets: [], notes: [] });
  }
  // JSON says so by its first bracket, whatever was asked for: "shots" then settles a plain list.
  const given = formats.find(({ id }) => id === options.format);
  const bracketed = json.claims(source) ? json : undefined;
  const format = bracketed ?? given ?? formats.find((candidate) => candidate.claims(source));
  return finish(source, format?.read(source) ?? { datasets: [], notes: [] });
}

function finishPlain(source: Source, typed: boolean): ReadResult {
  if (typed) source.reading.encoding = null;
  return finish(source, shots.read(source));
}

function finish(source: Source, { datasets, notes }: Outcome): ReadResult {
  const { problems, reading } = source;
  if (!problems.any && datasets.length === 0) {
    problems.whole('The file is empty.', 'Give a table of counts and numbers of shots.', 1);
  }
  if (!problems.any) return { ok: true, datasets, reading, notes };
  const kept = [...problems.kept].sort(
    (a, b) => (a.line ?? 0) - (b.line ?? 0) || (a.column ?? 0) - (b.column ?? 0)
  );
  return { ok: false, problems: kept, more: problems.more, reading };
}

function refuse(options: ReadOptions, problem: Problem, encoding: Guess<Encoding> | null = null): ReadResult {
  const source = new Source('', options);
  source.reading.encoding = encoding;
  source.problems.add(() => problem);
  return finish(source, { datasets: [], notes: [] });
}
