/** What a member of a team may be, the widest first. */
export const ROLES = ['lead', 'experimenter', 'observer'] as const;

export type Role = (typeof ROLES)[number];
