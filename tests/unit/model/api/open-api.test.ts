import { openApi } from '$lib/model/api/open-api';
import { OPERATIONS } from '$lib/model/api/operations';
import { apiPage } from '$lib/model/api/api-page';
import { SCOPES_OF_ROLE, ACTION_OF_SCOPE, SCOPES } from '$lib/model/api/scopes';
import { ACTIONS } from '$lib/server/access/actions';
import { ROLES } from '$lib/model/team/roles';
import { describe, expect, it } from 'vitest';
import { sourceFiles } from '../../../support/source-files';

/** Every way into the API that its route modules offer, with the scope each asks for. */
const doors = sourceFiles(['src/routes/api/v1']).flatMap(({ path, text }) => {
  const folder = /^src\/routes\/api\/v1(\/.*)\/\+server\.ts$/.exec(path)?.[1];
  if (!folder || folder === '/openapi.json') return [];
  const parts = text.split(/^export const /m).slice(1);
  return parts.map((part) => {
    const method = /^\w+/.exec(part)?.[0].toLowerCase();
    const scope = /askToken\(event, '(\w+)'[,)]/.exec(part)?.[1];
    return `${method} ${folder.replace(/\[(\w+)\]/g, '{$1}')} ${scope}`;
  });
});

describe('the description of the API', () => {
  it('names every route with its scope, and no other', () => {
    expect(doors.length).toBeGreaterThan(10);
    const described = OPERATIONS.map(({ method, path, scope }) => `${method} ${path} ${scope}`);
    expect(described.sort()).toEqual(doors.sort());
  });

  it('gives each operation a name of its own', () => {
    expect(new Set(OPERATIONS.map(({ id }) => id)).size).toBe(OPERATIONS.length);
  });

  it('is plain JSON in which every reference leads somewhere', () => {
    const text = JSON.stringify(openApi());
    const document = JSON.parse(text) as Record<string, unknown>;
    const references = [...text.matchAll(/"\$ref":"#\/([^"]+)"/g)].map(([, path]) => path);
    expect(references.length).toBeGreaterThan(0);
    for (const path of references) {
      const found = path
        .split('/')
        .reduce<unknown>((node, key) => (node as Record<string, unknown> | undefined)?.[key], document);
      expect(found, path).toBeDefined();
    }
  });

  it('shows every operation on its page', () => {
    const shown = apiPage().flatMap(({ operations }) => operations.map(({ id }) => id));
    expect(shown.sort()).toEqual(OPERATIONS.map(({ id }) => id).sort());
  });
});

describe('scopes', () => {
  it('of a role are those that the table of roles grants it', () => {
    for (const role of ROLES)
      expect(SCOPES_OF_ROLE[role], role).toEqual(
        SCOPES.filter((scope) => ACTIONS[ACTION_OF_SCOPE[scope]][role] === 'yes')
      );
  });
});
