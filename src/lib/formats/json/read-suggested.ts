import { readKept } from '../../model/read-kept';
import type { Geometry, Unit } from '../../stats/types';
import type { Suggested } from '../types';
import type { JsonReader } from './json-reader';
import { describe, type JsonNode, member } from './node';

const units: Unit[] = ['defect', 'pair'];
const geometries: Geometry[] = ['sites', 'open-bonds', 'ring-bonds'];

const rates = [
  ['misread', 'misread probability'],
  ['misreadUncertainty', 'uncertainty of the misread probability']
] as const;

/** Keys of an object that state options of the diagnosis. */
export const suggestedKeys = ['trials', 'unit', 'geometry', 'misread', 'misreadUncertainty', 'kept'];

/**
 * Options that an object states beside its counts; a value that cannot be one is a problem, since
 * dropping it would change the answer unseen.
 */
export function readSuggested(reader: JsonReader, root: JsonNode): Suggested {
  const suggested: Suggested = {};
  const trials = member(root, 'trials');
  if (trials) {
    const unknown =
      (trials.kind === 'literal' && trials.value === null) ||
      (trials.kind === 'string' && trials.value === 'unknown');
    const read = unknown ? null : reader.whole(trials, 'trials');
    if (unknown || read !== null) suggested.trials = read;
  }
  const unit = oneOf(reader, member(root, 'unit'), units);
  if (unit) suggested.unit = unit;
  const geometry = oneOf(reader, member(root, 'geometry'), geometries);
  if (geometry) suggested.geometry = geometry;
  for (const [key, name] of rates) {
    const given = member(root, key);
    if (!given) continue;
    if (given.kind === 'literal' && given.value === null) suggested[key] = null;
    else {
      const value = given.kind === 'number' ? Number(given.raw) : NaN;
      if (value >= 0 && value < 0.5) suggested[key] = value;
      else
        reader.problem(
          given.at,
          `The ${name} is ${describe(given)}.`,
          'Give a number from 0 up to below 0.5, or leave it out.'
        );
    }
  }
  const kept = readCut(reader, member(root, 'kept'));
  if (kept) suggested.kept = kept;
  return suggested;
}

/** Counts kept, as `{"from": 0, "to": 4}` of a diagnosis document or as "0-4"; null where none were cut. */
function readCut(reader: JsonReader, node: JsonNode | null): Suggested['kept'] | null {
  if (!node || (node.kind === 'literal' && node.value === null)) return null;
  const end = (key: string) => {
    const given = member(node, key);
    // Anything else than a number or nothing makes no cut that could be read.
    return given?.kind === 'number'
      ? given.raw
      : !given || (given.kind === 'literal' && given.value === null)
        ? ''
        : '?';
  };
  const cut = readKept(node.kind === 'string' ? node.value : `${end('from')}-${end('to')}`);
  if (!cut)
    reader.problem(
      node.at,
      `The counts kept are ${describe(node)}.`,
      'Give the smallest and the largest count kept, as "0-4" or "1-", or leave it out.'
    );
  return cut;
}

function oneOf<T extends string>(reader: JsonReader, node: JsonNode | null, allowed: T[]): T | null {
  if (!node) return null;
  const found = node.kind === 'string' ? allowed.find((value) => value === node.value) : undefined;
  if (found === undefined) {
    reader.problem(node.at, `This must be one of ${allowed.join(', ')}.`, 'Correct it, or leave it out.');
  }
  return found ?? null;
}
