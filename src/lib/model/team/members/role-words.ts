import type { Role } from '../roles';

/** What each role may do, in one line. */
export const ROLE_WORDS: Record<Role, { name: string; article: string; may: string }> = {
  lead: {
    name: 'lead',
    article: 'a lead',
    may: 'sees and changes everything, invites and removes people'
  },
  experimenter: {
    name: 'experimenter',
    article: 'an experimenter',
    may: 'uploads and diagnoses; deletes and links what is their own'
  },
  observer: { name: 'observer', article: 'an observer', may: 'sees everything and remarks on it' }
};
