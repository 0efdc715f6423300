import type { Problem } from '../problem';
import { problem } from '../problem';
import type { z } from 'zod';

export const NOT_HERE: Problem = {
  status: 404,
  code: 'not-found',
  title: 'There is nothing at this address.'
};

/** A body that is not JSON, was cut short, or is nested or filled beyond anything that is read. */
export const badJson = (why: string): Problem => ({
  status: 400,
  code: 'bad-json',
  title: 'The body is not JSON that can be read. Nothing was done.',
  detail: why
});

/** Most faults told of at once. */
const MOST = 20;

/** Faults in the shape of the API: the first 20, and how many there are beyond. */
export function faults<Fault>(list: Fault[], more = 0): { errors: Fault[]; more?: number } {
  const beyond = more + Math.max(0, list.length - MOST);
  return { errors: list.slice(0, MOST), ...(beyond > 0 ? { more: beyond } : {}) };
}

/** JSON that is held to the shape its operation documents; for nobody's cache. */
export function told<Shape extends z.ZodType>(
  _shape: Shape,
  body: z.output<Shape>,
  { status = 200, headers = {} }: { status?: number; headers?: Record<string, string> } = {}
): Response {
  return new Response(JSON.stringify(body), {
    status,
    headers: { 'content-type': 'application/json', 'cache-control': 'no-store', ...headers }
  });
}

/** The query of an address by its schema. Parameters nobody knows are told too: a misspelt filter must not pass for none. */
export function readQuery<Shape extends z.ZodType>(
  url: URL,
  schema: Shape
): { ok: true; query: z.output<Shape> } | { ok: false; response: Response } {
  const given: Record<string, string> = {};
  const twice: string[] = [];
  for (const [name, value] of url.searchParams) {
    if (name in given) twice.push(name);
    given[name] = value;
  }
  const read = schema.safeParse(given);
  if (read.success && twice.length === 0) return { ok: true, query: read.data };
  const list = [
    ...twice.map((at) => ({ at, message: 'It stands there twice.' })),
    ...(read.error?.issues ?? []).map(({ path, message }) => ({ at: path.join('.'), message }))
  ];
  const title = 'The part of the address after “?” does not fit.';
  return { ok: false, response: problem({ status: 422, code: 'bad-query', title, ...faults(list) }) };
}

/** The answer to a list: the page, and the address of the next one as a Link field (RFC 8288). */
export function nextPage(url: URL, next: string | null): Record<string, string> {
  if (next === null) return {};
  const address = new URL(url);
  address.searchParams.set('after', next);
  return { link: `<${address.pathname}${address.search}>; rel="next"` };
}

export const BAD_CURSOR: Problem = {
  status: 422,
  code: 'bad-query',
  title: 'The part of the address after “?” does not fit.',
  errors: [{ at: 'after', message: 'This is not the “next” of a page.' }]
};

/** A report or sweep whose stored document no longer can be read. */
export const damaged = (why: string, of: 'report' | 'sweep' = 'report'): Problem => ({
  status: 500,
  code: 'unreadable',
  title: `The document of this ${of} cannot be read: ${why}.`,
  detail: 'Its bytes are kept: take document.json.'
});
