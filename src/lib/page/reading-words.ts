import type { FormatId, Guess, Role } from '$lib/formats/types';

export const FORMATS: Record<FormatId, string> = {
  counts: 'a table of counts and numbers of shots',
  shots: 'a list of shots, one count each',
  positions: 'numbers of shots for 0, 1, 2 … in that order',
  json: 'JSON'
};

export const SEPARATORS = {
  comma: 'comma',
  semicolon: 'semicolon',
  tab: 'tab',
  spaces: 'spaces',
  none: 'none, one number a line'
} as const;

export const ROLES: Record<Role, string> = {
  count: 'count of defects',
  frequency: 'number of shots',
  shot: 'number of the shot',
  batch: 'batch',
  condition: 'condition that tells datasets apart',
  ignored: 'not used'
};

export const ENCODINGS = {
  'utf-8': 'UTF-8',
  'utf-16le': 'UTF-16 (little-endian)',
  'utf-16be': 'UTF-16 (big-endian)',
  'windows-1252': 'Windows 1252'
} as const;

/** Where a decision came from, for the reader who wonders. */
export const fromWords = ({ from, why }: Guess<unknown>): string =>
  from === 'given' ? 'as you said' : from === 'stated' ? `the file says so: ${why}` : `guessed: ${why}`;
