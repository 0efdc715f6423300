import type { LinkOptions } from '$lib/model/link/link-options';
import { hidesCounts } from '$lib/model/link/hides-counts';
import type { Diagnosis } from '$lib/stats/types';
import { newToken } from '../../auth/new-token';
import type { Database } from '../../db/client';
import { newId } from '../../db/new-id';
import { link } from '../../db/schema';
import type { Actor } from '../access/actor';
import { recordEvent } from '../events/record-event';
import { linkable, type Opens } from './linkable';

export type MadeLink =
  | { ok: true; id: string; token: string }
  /**
   * `shows-counts`: the cumulants of a sweep stand to their last digit, so it keeps no counts back. `no-remarks`: a
   * sweep takes none. `too-few-counts`: what is left of a report would give so few shots, or different counts, away.
   */
  | {
      ok: false;
      reason: 'unknown' | 'not-allowed' | 'past' | 'too-few-counts' | 'shows-counts' | 'no-remarks';
    };

/**
 * Makes a link to a report or a sweep. The token is in the answer and nowhere else: the database keeps its hash. Mail to
 * named people is another matter: see mailLink.
 */
export function makeLink(
  db: Database,
  actor: Actor,
  opens: Opens,
  options: LinkOptions,
  now = Date.now()
): MadeLink {
  if (options.expiresAt !== null && options.expiresAt <= now) return { ok: false, reason: 'past' };
  return db.transaction(
    (tx): MadeLink => {
      const found = linkable(tx, actor, opens);
      if (!found.ok) return found;
      if ('sweep' in opens && options.shows === 'report') return { ok: false, reason: 'shows-counts' };
      if ('sweep' in opens && options.allowsRemarks) return { ok: false, reason: 'no-remarks' };
      if (options.shows === 'report' && !hidesCounts(JSON.parse(found.document) as Diagnosis))
        return { ok: false, reason: 'too-few-counts' };
      const { token, hash } = newToken();
      const id = newId();
      const { people, ...rest } = options;
      tx.insert(link)
        .values({
          ...rest,
          id,
          teamId: actor.teamId,
          reportId: 'report' in opens ? opens.report : null,
          sweepId: 'sweep' in opens ? opens.sweep : null,
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
          thing: 'sweep' in opens ? opens.sweep : opens.report,
          detail: { audience: options.audience, shows: options.shows, blind: options.blind }
        },
        now
      );
      return { ok: true, id, token };
    },
    { behavior: 'immediate' }
  );
}
