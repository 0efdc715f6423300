import type { Role } from '$lib/model/team/roles';

/** `own`: only what the person made. */
export type Grant = 'yes' | 'own' | 'no';

/**
 * Who may do what in a team: the whole of it, and the only place. A link adds `see` and, where it says so,
 * `remark`, for its one report or sweep; see can.
 */
export const ACTIONS = {
  /** Datasets, reports, jobs of the team. */
  see: { lead: 'yes', experimenter: 'yes', observer: 'yes' },
  upload: { lead: 'yes', experimenter: 'yes', observer: 'no' },
  /** Conditions of a dataset. */
  edit: { lead: 'yes', experimenter: 'yes', observer: 'no' },
  diagnose: { lead: 'yes', experimenter: 'yes', observer: 'no' },
  delete: { lead: 'yes', experimenter: 'own', observer: 'no' },
  restore: { lead: 'yes', experimenter: 'own', observer: 'no' },
  /** Make and revoke links to a report or a sweep. */
  link: { lead: 'yes', experimenter: 'own', observer: 'no' },
  remark: { lead: 'yes', experimenter: 'yes', observer: 'yes' },
  /** Make and revoke tokens of scripts, each at most of the own role. */
  script: { lead: 'yes', experimenter: 'own', observer: 'own' },
  /** Members, invitations, settings, events, export and import. */
  manage: { lead: 'yes', experimenter: 'no', observer: 'no' }
} as const satisfies Record<string, Record<Role, Grant>>;

export type Action = keyof typeof ACTIONS;
