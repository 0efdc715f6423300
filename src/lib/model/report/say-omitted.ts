import type { Diagnosis } from '$lib/stats/types';
import { REFERENCES } from '../labels';

/** The reference laws left out and why; '' when there are none. That nobody supplied a law is no news to its reader. */
export function sayOmitted({ fit }: Diagnosis): string {
  const told = fit.omitted.filter(({ id }) => id !== 'supplied');
  if (told.length === 0) return '';
  const each = told.map(({ id, reason }) => `${REFERENCES[id]} (${reason.replace(/\.$/, '')})`);
  return `Left out: ${each.join('; ')}.`;
}
