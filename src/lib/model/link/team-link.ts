import type { Audience, Shows } from './link-options';
import type { LinkState } from './link-state';

/** A link as its team sees it; the token is not in it. */
export interface TeamLink {
  id: string;
  label: string;
  audience: Audience;
  people: string[];
  shows: Shows;
  blind: boolean;
  hidesReferees: boolean;
  allowsRemarks: boolean;
  visitLimit: number | null;
  expiresAt: number | null;
  revokedAt: number | null;
  createdAt: number;
  state: LinkState;
  /** Visits counted, and times it was refused. */
  visits: number;
  refused: number;
  lastVisitAt: number | null;
}

/** One line of a link's log; `who` is null for strangers, and for everybody where the link hides its referees. */
export interface LinkVisit {
  at: number;
  who: string | null;
  outcome: 'opened' | 'refused';
}
