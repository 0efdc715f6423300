import type { LinkOptions } from '$lib/model/link/link-options';

/** The form of a new link, as typed. */
export interface LinkFields {
  label: string;
  audience: LinkOptions['audience'];
  /** One address a line; commas and semicolons part them too, as mail programs write lists. */
  people: string;
  shows: LinkOptions['shows'];
  blind: boolean;
  hidesReferees: boolean;
  allowsRemarks: boolean;
  /** A day, YYYY-MM-DD, or empty. */
  until: string;
  visits: string;
}

/** A form as it begins. A sweep takes no remarks. */
export const freshFields = (opens: 'report' | 'sweep' = 'report'): LinkFields => ({
  label: '',
  audience: 'anyone',
  people: '',
  shows: 'report-and-counts',
  blind: false,
  hidesReferees: false,
  allowsRemarks: opens === 'report',
  until: '',
  visits: ''
});

const DAY = 86_400_000;

/** The form as what linkOptionsSchema checks; what is no number becomes NaN, which it refuses. */
export function readFields(fields: LinkFields): Record<keyof LinkOptions, unknown> {
  const { label, audience, shows, blind, hidesReferees, allowsRemarks } = fields;
  const people = fields.people.split(/[\n,;]+/).map((line) => line.trim());
  return {
    label,
    audience,
    people: audience === 'named' ? people.filter((line) => line !== '') : [],
    shows,
    blind,
    hidesReferees,
    allowsRemarks,
    // The end of that day: a link open until the 3rd opens on the 3rd.
    expiresAt: fields.until === '' ? null : Date.parse(`${fields.until}T00:00:00Z`) + DAY,
    visitLimit: fields.visits.trim() === '' ? null : Number(fields.visits.replace(/\s+/g, ''))
  };
}
