import type { Diagnosis } from '$lib/stats/types';
import { REFERENCES } from '../labels';

/** The reference laws left out and why; '' when there are none. */
export function sayOmitted({ fit }: Diagnosis): string {
  if (fit.omitted.length === 0) return '';
  const each = fit.omitted.map(({ id, reason }) => `${REFERENCES[id]} (${reason.replace(/\.$/, '')})`);
  return `Left out: ${each.join('; ')}.`;
}
