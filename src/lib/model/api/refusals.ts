import type { Operation } from './operation';

type Json = { [key: string]: unknown };

/** Fields that answers carry, as OpenAPI tells them. */
export const LIMITS_TOLD = {
  RateLimit: {
    description: 'What is left: "token";r=requests;t=seconds (draft-ietf-httpapi-ratelimit-headers)',
    schema: { type: 'string' }
  },
  'RateLimit-Policy': {
    description: 'The limit: "token";q=requests;w=seconds',
    schema: { type: 'string' }
  },
  'Retry-After': { description: 'Seconds to wait', schema: { type: 'string' } },
  'WWW-Authenticate': { description: 'RFC 6750', schema: { type: 'string' } },
  Location: { description: 'Address of what was made', schema: { type: 'string' } }
} as const;

type Told = keyof typeof LIMITS_TOLD;

/** What every operation may answer, whoever asks for what. */
export const REFUSALS: Record<number, { name: string; about: string; headers?: Told[] }> = {
  401: {
    name: 'NoToken',
    about: 'No token came, or one that opens nothing (any more).',
    headers: ['WWW-Authenticate', 'RateLimit', 'RateLimit-Policy']
  },
  403: { name: 'NotAllowed', about: 'The scope or role of the token does not reach.' },
  429: {
    name: 'TooMany',
    about: 'Too many requests, or too many diagnoses waiting.',
    headers: ['RateLimit', 'RateLimit-Policy', 'Retry-After']
  },
  500: { name: 'Failed', about: 'Something went wrong on the side of the server.' },
  503: { name: 'Busy', about: 'The database is busy; nothing was changed.' }
};

export const headersOf = (names: Told[] = ['RateLimit', 'RateLimit-Policy']): Json =>
  Object.fromEntries(names.map((name) => [name, { $ref: `#/components/headers/${name}` }]));

/** The refusals of one operation by their status. */
export function refusalsOf({ idOf, query, bodies, refusals = {} }: Operation, content: Json): Json {
  const own: Record<number, string | undefined> = {
    ...(idOf ? { 404: `The team has no such ${idOf}, or it was put aside.` } : {}),
    ...(query && !bodies ? { 422: 'A parameter does not fit, or is not known.' } : {}),
    ...(bodies ? { 507: 'The disk of the server is full; nothing was saved.' } : {}),
    ...refusals
  };
  return {
    ...Object.fromEntries(
      Object.entries(REFUSALS).map(([status, { name }]) => [
        status,
        { $ref: `#/components/responses/${name}` }
      ])
    ),
    ...Object.fromEntries(
      Object.entries(own).map(([status, description]) => [
        status,
        { description, headers: headersOf(), content }
      ])
    )
  };
}
