import { linkState } from '$lib/model/link/link-state';
import { shownByLink, type LinkView } from '$lib/model/link/shown-by-link';
import { and, eq, gt } from 'drizzle-orm';
import { hashToken } from '../../auth/new-token';
import type { Database } from '../../db/client';
import { linkVisit } from '../../db/schema';
import { findLink, type FoundLink } from './find-link';
import { isMeant } from './is-meant';
import { noteVisit } from './note-visit';
import { sharedThing } from './shared-thing';

export type LinkRefusal =
  'unknown' | 'expired' | 'revoked' | 'used-up' | 'sign-in' | 'not-named' | 'not-in-team';

/** What routes and services of remarks need of an open link; it never goes to the page. */
export type OpenedLink = Pick<
  FoundLink,
  'id' | 'teamId' | 'teamSlug' | 'reportId' | 'allowsRemarks' | 'hidesReferees' | 'blind' | 'shows'
>;

export type OpenLink =
  /** `visit` is for the browser to keep: shown again within the hour, it is the same visit. Null: none was counted. */
  { ok: true; link: OpenedLink; view: LinkView; visit: string | null } | { ok: false; reason: LinkRefusal };

/** A visit lasts an hour, milliseconds: reading a report takes that, and reloading it is no second visit. */
export const VISIT_LASTS = 3_600_000;

/** Tokens are 43 letters of base64url; anything else was never one of ours. */
const SHAPE = /^[A-Za-z0-9_-]{43}$/;

/**
 * Opens a link, or says why not. Malformed tokens, unknown ones and those of a team that is gone look alike.
 *
 * Looking and counting are one immediate transaction: of many who come at once, a limit of three lets three in.
 *
 * @param person who is signed in; null for strangers
 * @param visit what an earlier answer gave this browser to keep
 * @param counts false for a request that is shown nothing: it is no visit and stands in no log
 */
export function openLink(
  db: Database,
  token: string,
  person: { id: string } | null,
  now = Date.now(),
  visit?: string | null,
  counts = true
): OpenLink {
  if (!SHAPE.test(token)) return { ok: false, reason: 'unknown' };
  const hash = hashToken(token);
  return db.transaction(
    (tx): OpenLink => {
      const found = findLink(tx, hash);
      if (!found) return { ok: false, reason: 'unknown' };
      const reason = refusal();
      if (reason === null) {
        const kept = visit && lasts(visit) ? visit : null;
        if (kept !== null || linkState(found, found.visits, now) === 'open') {
          const opened = kept ?? note(found.id, 'opened');
          const { id, teamId, teamSlug, reportId, allowsRemarks, hidesReferees, blind, shows } = found;
          const link = { id, teamId, teamSlug, reportId, allowsRemarks, hidesReferees, blind, shows };
          return { ok: true, link, view: shownByLink(found, sharedThing(found)), visit: opened };
        }
      }
      note(found.id, 'refused');
      return { ok: false, reason: reason ?? 'used-up' };

      function note(linkId: string, outcome: 'opened' | 'refused'): string | null {
        return counts ? noteVisit(tx, linkId, person?.id ?? null, outcome, now) : null;
      }

      /** Why the link is closed to this person, visits aside. */
      function refusal(): Exclude<LinkRefusal, 'unknown' | 'used-up'> | null {
        if (found!.gone) return 'revoked';
        const state = linkState({ ...found!, visitLimit: null }, 0, now);
        if (state === 'revoked' || state === 'expired') return state;
        return isMeant(tx, found!, person?.id ?? null);
      }

      function lasts(id: string): boolean {
        const mine = and(
          eq(linkVisit.id, id),
          eq(linkVisit.linkId, found!.id),
          eq(linkVisit.outcome, 'opened'),
          gt(linkVisit.at, now - VISIT_LASTS)
        );
        return tx.select({ id: linkVisit.id }).from(linkVisit).where(mine).get() !== undefined;
      }
    },
    { behavior: counts ? 'immediate' : 'deferred' }
  );
}
