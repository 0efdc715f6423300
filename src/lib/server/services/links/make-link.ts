import type { LinkOptions } from '$lib/model/link/link-options';
import { hidesCounts } from '$lib/model/link/hides-counts';
import type { Diagnosis } from '$lib/stats/types';
import { newToken } from '../../auth/new-token';
import type { Database } from '../../db/client';
import { newId } from '../../db/new-id';
import { link } from '../../db/schema';
import type { Actor } from '../access/actor';
import { recordEvent } from '../events/record-event';
import { linkableReport } from './linkable-report';

export type MadeLink =
  | { ok: true; id: string; token: string }
  /** `too-few-counts`: what is left of a report would give so few shots, or different counts, away. */
  | { ok: false; reason: 'unknown' | 'not-allowed' | 'past' | 'too-few-counts' };

/**
 * Makes a link to a report. The token is in the answer and nowhere else: the database keeps its hash. Mail to named
 * people is another matter: see mailLink.
 */
export function makeLink(
  db: Database,
  actor: Actor,
  reportId: string,
  options: LinkOptions,
  now = Date.now()
): MadeLink {
  if (options.expiresAt !== null && options.expiresAt <= now) return { ok: false, reason: 'past' };
  return db.transaction(
    (tx): MadeLink => {
      const found = linkableReport(tx, actor, reportId);
      if (!found.ok) return found;
      if (options.shows === 'report' && !hidesCounts(JSON.parse(found.report.document) as Diagnosis))
        return { ok: false, reason: 'too-few-counts' };
      const { token, hash } = newToken();
      const id = newId();
      const { people, ...rest } = options;
      tx.insert(link)
        .values({
          ...rest,
          id,
          teamId: actor.teamId,
          reportId,
          tokenHash: hash,
          people: JSON.stringify(options.audience === 'named' ? people : []),
          createdBy: actor.personId,
          createdAt: now
        })
        .run();
      recordEvent(
        tx,
        {
          action: 'link.make',
          teamId: actor.teamId,
          personId: actor.personId,
          linkId: id,
          thing: reportId,
          detail: { audience: options.audience, shows: options.shows, blind: options.blind }
        },
        now
      );
      return { ok: true, id, token };
    },
    { behavior: 'immediate' }
  );
}
