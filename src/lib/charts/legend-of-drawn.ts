import type { LegendEntry, Mark, Role } from './picture';

/** What may be missing from a picture: it is explained only where it is drawn. */
const SOMETIMES: readonly Role[] = ['unseen', 'shade', 'bound'];

/** The entries of a legend without those whose marks are not in the picture. */
export const legendOfDrawn = (marks: Mark[], entries: LegendEntry[]): LegendEntry[] =>
  entries.filter(
    ({ role }) =>
      !SOMETIMES.includes(role) ||
      marks.some((mark) => mark.kind === 'path' && mark.role === role && mark.d !== '')
  );
