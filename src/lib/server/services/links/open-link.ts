import { linkState } from '$lib/model/link/link-state';
import { shownByLink, type LinkView } from '$lib/model/link/shown-by-link';
import { sweepByLink, type SweepView } from '$lib/model/link/sweep-by-link';
import { and, eq, gt } from 'drizzle-orm';
import { hashToken } from '../../auth/new-token';
import type { Database } from '../../db/client';
import { linkVisit } from '../../db/schema';
import { findLink, type FoundLink } from './find-link';
import { isMeant } from './is-meant';
import { noteVisit } from './note-visit';
import { sharedReport } from './shared-report';
import { sharedSweep } from './shared-sweep';

export type LinkRefusal =
  /** `other-kind`: it opens another kind of thing than the address is for. */
  'unknown' | 'other-kind' | 'expired' | 'revoked' | 'used-up' | 'sign-in' | 'not-named' | 'not-in-team';

/** What routes and services of remarks need of an open link; it never goes to the page. */
export type OpenedLink = Pick<
  FoundLink,
  'id' | 'teamId' | 'teamSlug' | 'allowsRemarks' | 'hidesReferees' | 'blind' | 'shows'
> & {
  /** Id of the report or sweep that it opens. */
  thingId: string;
};

/** What a link opens, and what of it is shown. */
export type ShownThing = { opens: 'report'; view: LinkView } | { opens: 'sweep'; view: SweepView };

export type OpenLink<Of extends ShownThing['opens'] = 'report'> =
  /** `visit` is for the browser to keep: shown again within the hour, it is the same visit. Null: none was counted. */
  | ({ ok: true; link: OpenedLink; visit: string | null } & Extract<ShownThing, { opens: Of }>)
  | { ok: false; reason: LinkRefusal };

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
 * @param wanted what the address asked for is of: a link to something else does not open there, and nothing is noted
 */
export function openLink<Of extends ShownThing['opens'] = 'report'>(
  db: Database,
  token: string,
  person: { id: string } | null,
  now = Date.now(),
  visit?: string | null,
  counts = true,
  wanted: Of | 'report' = 'report'
): OpenLink<Of> {
  if (!SHAPE.test(token)) return { ok: false, reason: 'unknown' };
  const hash = hashToken(token);
  return db.transaction(
    (tx): OpenLink<Of> => {
      const found = findLink(tx, hash);
      if (!found) return { ok: false, reason: 'unknown' };
      if (wanted !== kindOf(found)) return { ok: false, reason: 'other-kind' };
      const shown = shownThing(tx, found);
      const reason = refusal();
      if (reason === null && shown !== null) {
        const kept = visit && lasts(visit) ? visit : null;
        if (kept !== null || linkState(found, found.visits, now) === 'open') {
          const opened = kept ?? note(found.id, 'opened');
          const thingId = (found.sweepId ?? found.reportId)!;
          const { id, teamId, teamSlug, allowsRemarks, hidesReferees, blind, shows } = found;
          const link = { id, thingId, teamId, teamSlug, allowsRemarks, hidesReferees, blind, shows };
          return { ok: true, link, ...(shown as Extract<ShownThing, { opens: Of }>), visit: opened };
        }
      }
      note(found.id, 'refused');
      return { ok: false, reason: reason ?? 'used-up' };

      function note(linkId: string, outcome: 'opened' | 'refused'): string | null {
        return counts ? noteVisit(tx, linkId, person?.id ?? null, outcome, now) : null;
      }

      /** Why the link is closed to this person, visits aside. */
      function refusal(): Exclude<LinkRefusal, 'unknown' | 'other-kind' | 'used-up'> | null {
        if (shown === null) return 'revoked';
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

const kindOf = ({ sweepId }: FoundLink): ShownThing['opens'] => (sweepId === null ? 'report' : 'sweep');

/** What the link shows of its report or sweep; null once that was put aside. */
function shownThing(db: Pick<Database, 'select'>, found: FoundLink): ShownThing | null {
  const { reportId, sweepId, team } = found;
  if (sweepId !== null) {
    const sweep = sharedSweep(db, sweepId, team);
    return sweep ? { opens: 'sweep', view: sweepByLink(found, sweep) } : null;
  }
  const report = reportId === null ? undefined : sharedReport(db, reportId, team);
  return report ? { opens: 'report', view: shownByLink(found, report) } : null;
}
