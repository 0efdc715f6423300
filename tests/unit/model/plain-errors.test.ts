import { plainError } from '$lib/model/plain-errors';
import { afterAll, beforeAll, expect, it } from 'vitest';
import { z } from 'zod';

const before = z.config().customError;
beforeAll(() => void z.config({ customError: plainError }));
afterAll(() => void z.config({ customError: before }));

const said = (schema: z.ZodType, value: unknown) => {
  const read = schema.safeParse(value);
  return read.success ? 'fits' : read.error.issues.map(({ message }) => message).join(' ');
};

it.each([
  ['a missing text', z.string(), undefined, 'This is missing.'],
  ['no number', z.number(), 'x', 'Write a number.'],
  ['NaN', z.number(), NaN, 'Write a number.'],
  ['a fraction', z.int(), 1.5, 'Write a whole number.'],
  ['a small number', z.number().min(1), 0, 'Write 1 or more.'],
  ['a number at an open end', z.number().gt(0), 0, 'Write more than 0.'],
  ['a large number', z.number().max(5), 6, 'Write 5 or less.'],
  ['an empty text', z.string().min(1), '', 'This is empty.'],
  ['a long text', z.string().max(3), 'long', 'Write at most 3 characters.'],
  ['a short list', z.array(z.number()).min(2), [1], 'Give at least 2.'],
  ['no list', z.array(z.number()), {}, 'Give a list.'],
  ['no object', z.object({}), [], 'Give an object, {"name": value}.'],
  ['another word', z.enum(['quench', 'hold']), 'wait', 'Choose one of quench, hold.'],
  ['an unknown name', z.strictObject({}), { trails: 1 }, 'Nothing here is called “trails”.'],
  [
    'neither',
    z.union([z.string(), z.number()]),
    true,
    'This fits none of the ways in which it can be written.'
  ],
  ['no such pattern', z.string().regex(/^a$/), 'b', 'This does not fit.'],
  ['a schema with its own words', z.string().min(1, 'Give it a name.'), '', 'Give it a name.']
])('%s is told in plain words', (_, schema, value, words) => {
  expect(said(schema, value)).toBe(words);
});
