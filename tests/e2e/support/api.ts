import { OPERATIONS } from '$lib/model/api/operations';
import type { TokenForm } from '$lib/model/api/token-form';
import type { Actor } from '$lib/server/services/access/actor';
import { makeToken } from '$lib/server/services/tokens/make-token';
import { withDatabaseOf } from './seed-people';
import type { RunningServer } from './start-server';

/** A token of a running server's team, as its page would make it. */
export function seedToken(
  server: Pick<RunningServer, 'data'>,
  actor: Actor,
  more: Partial<TokenForm> = {}
): Promise<string> {
  return withDatabaseOf(server, (db) => {
    const form: TokenForm = { name: 'test', role: actor.role, scopes: ['read'], days: 1, ...more };
    const made = makeToken(db, actor, form);
    if (!made.ok) throw new Error(made.reason);
    return made.token;
  });
}

export interface Asked {
  method?: string;
  body?: BodyInit;
  headers?: Record<string, string>;
}

/** Asks the API; `null` for no token. */
export function ask(
  server: Pick<RunningServer, 'address'>,
  token: string | null,
  path: string,
  asked: Asked = {}
) {
  const { method = 'GET', body, headers = {} } = asked;
  return fetch(`${server.address}/api/v1${path}`, {
    method,
    body,
    headers: { ...(token ? { authorization: `Bearer ${token}` } : {}), ...headers }
  });
}

export const JSON_TYPE = { 'content-type': 'application/json' };
export const CSV_TYPE = { 'content-type': 'text/csv' };

/** What can be asked for below the address of a report: '' for the report itself, and its files. */
export const REPORT_FILES = OPERATIONS.map(({ path }) => /^\/reports\/\{id\}(.*)$/.exec(path)?.[1]).filter(
  (file) => file !== undefined
);
