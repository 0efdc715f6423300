import type { z } from 'zod';

type Issue = Parameters<NonNullable<ReturnType<typeof z.config>['customError']>>[0];

const TYPES: Record<string, string> = {
  string: 'Write a text.',
  number: 'Write a number.',
  nan: 'Write a number.',
  int: 'Write a whole number.',
  boolean: 'Give true or false.',
  array: 'Give a list.',
  tuple: 'Give a list.',
  object: 'Give an object, {"name": value}.',
  record: 'Give an object, {"name": value}.'
};

/**
 * What is wrong with a value, in words for whoever wrote it; a schema's own words come before these. For
 * `z.config({ customError })`, so that no message of the library reaches a person or a script's answer.
 */
export function plainError(issue: Issue): string {
  switch (issue.code) {
    case 'invalid_type':
      return issue.input === undefined ? 'This is missing.' : (TYPES[issue.expected] ?? 'This does not fit.');
    case 'too_small':
      return atLeast(issue.origin, issue.minimum, issue.inclusive ?? true);
    case 'too_big':
      return atMost(issue.origin, issue.maximum, issue.inclusive ?? true);
    case 'invalid_value':
      return `Choose ${issue.values.length > 1 ? 'one of ' : ''}${issue.values.map(String).join(', ')}.`;
    case 'unrecognized_keys':
      return `Nothing here is called ${issue.keys.map((key) => `“${key}”`).join(' or ')}.`;
    case 'invalid_union':
      return 'This fits none of the ways in which it can be written.';
    default:
      return 'This does not fit.';
  }
}

function atLeast(origin: string, least: number | bigint, included: boolean): string {
  if (origin === 'string') return least === 1 ? 'This is empty.' : `Write at least ${least} characters.`;
  if (origin === 'array' || origin === 'set') return `Give at least ${least}.`;
  return included ? `Write ${least} or more.` : `Write more than ${least}.`;
}

function atMost(origin: string, most: number | bigint, included: boolean): string {
  if (origin === 'string') return `Write at most ${most} characters.`;
  if (origin === 'array' || origin === 'set') return `Give at most ${most}.`;
  return included ? `Write ${most} or less.` : `Write less than ${most}.`;
}
