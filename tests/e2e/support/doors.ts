import { sourceFiles } from '../../support/source-files';

/** One way in: a method on a route of a team, as its module offers it. */
export interface Door {
  /** As the folder spells it: /team/[team=slug]/datasets/[id]. */
  route: string;
  method: string;
  /** Name of a form action; null for anything else. */
  action: string | null;
}

/** Every way into the pages and JSON routes of a team, read from the modules themselves. */
export function doorsOfTeams(): Door[] {
  return sourceFiles(['src/routes/(team)/team']).flatMap(({ path, text }): Door[] => {
    const found = /^src\/routes\/\(team\)(\/team\/.*)\/\+(page\.server|server|layout\.server)\.ts$/.exec(
      path
    );
    if (!found) return [];
    const route = found[1];
    if (found[2] === 'server') {
      const methods = [...text.matchAll(/^export const (GET|POST|PUT|PATCH|DELETE)\b/gm)];
      return methods.map(([, method]) => ({ route, method, action: null }));
    }
    const actions = text.split(/^export const actions\b/m)[1] ?? '';
    const names = [...actions.matchAll(/^ {2}'?(\w[\w-]*)'?: async/gm)].map(([, name]) => name);
    return [
      { route, method: 'GET', action: null },
      ...names.map((action) => ({ route, method: 'POST', action }))
    ];
  });
}
