import { describe, expect, it } from 'vitest';
import { sourceFiles } from '../../support/source-files';

const asks = /\b(ask[A-Z]\w*|openToAll)\(/g;
const exported = /^export const (load|actions|GET|POST|PUT|PATCH|DELETE|fallback)\b/gm;

const modules = sourceFiles(['src/routes']).filter(({ path }) =>
  /\+((page|layout)\.)?server\.ts$/.test(path)
);

describe('route modules', () => {
  it('are found', () => expect(modules.length).toBeGreaterThan(5));

  it.each(modules)('$path asks for access, once for each thing it offers', ({ text }) => {
    // Each form action is a door of its own.
    const doors = [...text.matchAll(exported)].reduce((sum, [, name]) => {
      return sum + (name === 'actions' ? actionsIn(text) : 1);
    }, 0);
    expect(doors).toBeGreaterThan(0);
    expect([...text.matchAll(asks)].length).toBeGreaterThanOrEqual(doors);
  });

  it('of the API ask for a token, just once for each thing, and nothing that a cookie would answer', () => {
    const api = modules.filter(({ path }) => path.startsWith('src/routes/api/v1/'));
    expect(api.length).toBeGreaterThan(10);
    for (const { path, text } of api) {
      const asked = [...text.matchAll(asks)].map(([, name]) => name);
      const doors = [...text.matchAll(exported)];
      const wanted = path.includes('/openapi.json/') ? 'openToAll' : 'askToken';
      expect(asked, path).toEqual(doors.map(() => wanted));
      expect(text, path).not.toMatch(/locals\.person|cookies/);
    }
  });

  it('of a team never say that they are open to all', () => {
    for (const { path, text } of modules) {
      if (path.includes('/team/')) expect(text, path).not.toMatch(/openToAll\(/);
    }
  });
});

/** Entries of `actions`: lines such as "  save: async (event) => {" at the first level. */
function actionsIn(text: string): number {
  const [, after] = text.split(/^export const actions\b/m);
  const body = after.slice(0, after.search(/^\};?$|^\} satisfies/m));
  return [...body.matchAll(/^ {2}(?:async )?['\w]+(?::|\()/gm)].length;
}
