import type { LegendEntry, Mark } from './picture';

/** Legend entries of the triangles, for those that are drawn. */
export function legendOfStanding(marks: Mark[], what: string): LegendEntry[] {
  const drawn = (role: LegendEntry['role']) =>
    marks.some((mark) => mark.kind === 'path' && mark.role === role);
  const entries: LegendEntry[] = [
    { role: 'observed-more', label: `${what} more often than the law allows` },
    { role: 'observed-fewer', label: `${what} less often than the law allows` }
  ];
  return entries.filter(({ role }) => drawn(role));
}
