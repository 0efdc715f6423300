import type { Role } from '../team/roles';

/** What a token lets a script do, each for itself. */
export const SCOPES = ['read', 'upload', 'diagnose', 'edit', 'webhooks'] as const;
export type Scope = (typeof SCOPES)[number];

export const SCOPE_WORDS: Record<Scope, string> = {
  read: 'read datasets, reports, sweeps and their files',
  upload: 'upload datasets',
  diagnose: 'ask for diagnoses and make sweeps',
  edit: 'set the rules of gates',
  webhooks: 'keep webhooks, and read what was sent to them'
};

/** The action in the table of roles that a scope stands for. */
export const ACTION_OF_SCOPE = {
  read: 'see',
  upload: 'upload',
  diagnose: 'diagnose',
  edit: 'edit',
  webhooks: 'manage'
} as const;

/** Scopes that a role can use; the others would be refused whatever the token says. */
export const SCOPES_OF_ROLE: Record<Role, readonly Scope[]> = {
  lead: SCOPES,
  experimenter: ['read', 'upload', 'diagnose', 'edit'],
  observer: ['read']
};
