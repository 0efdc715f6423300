import { cleanName, signatureSchema } from '$lib/model/team/remarks/remark-input';
import { and, eq, isNull } from 'drizzle-orm';
import type { Database } from '../../db/client';
import { dataset, link, person, report } from '../../db/schema';
import type { Actor } from '../access/actor';
import { mayWhere } from '../access/may-where';
import { dayOf } from '../links/day-of';
import { isNameTaken } from './is-name-taken';

/** Who remarks: a member of the team, or somebody who came by a link that the caller has opened for them. */
export type RemarkAuthor =
  | { kind: 'member'; actor: Actor }
  /** `signedAs` may be empty; it is not kept where the link hides referees. */
  | { kind: 'referee'; linkId: string; personId: string | null; signedAs: string };

/** Signature of a referee who gave no name, or whose name the link hides. */
export const A_REFEREE = 'A referee';

export interface Signature {
  teamId: string;
  /** Null for one who came without signing in. */
  personId: string | null;
  /** The same for the events and for what the team can see: null where the link hides referees. */
  shownPersonId: string | null;
  linkId: string | null;
  signedAs: string;
  /** When the events say it was: the day alone where the link hides referees. */
  shownAt: number;
}

export type SignRemark =
  | { ok: true; signature: Signature }
  /** `name`: the signature would be read as the team's, or is too long. */
  | { ok: false; reason: 'unknown' | 'not-allowed' | 'name' };

/**
 * Whether an author may remark on a report now, and how the remark will be signed. A name that the link hides never
 * gets into the signature, so that no later change of the link, export or lost row can bring it out.
 */
export function signRemark(
  db: Pick<Database, 'select'>,
  author: RemarkAuthor,
  reportId: string,
  now: number
): SignRemark {
  const here = and(eq(report.id, reportId), isNull(report.deletedAt), isNull(dataset.deletedAt));
  if (author.kind === 'member') {
    const { actor } = author;
    const found = db
      .select({ name: person.name })
      .from(report)
      .innerJoin(dataset, eq(dataset.id, report.datasetId))
      .innerJoin(person, eq(person.id, actor.personId))
      .where(and(here, mayWhere(actor, 'remark', report.teamId)))
      .get();
    if (!found) return { ok: false, reason: 'unknown' };
    const { personId, teamId } = actor;
    return {
      ok: true,
      signature: {
        teamId,
        personId,
        shownPersonId: personId,
        linkId: null,
        signedAs: cleanName(found.name),
        shownAt: now
      }
    };
  }
  const { linkId, personId, signedAs } = author;
  const found = db
    .select({
      teamId: link.teamId,
      allows: link.allowsRemarks,
      hides: link.hidesReferees,
      blind: link.blind,
      revokedAt: link.revokedAt,
      expiresAt: link.expiresAt
    })
    .from(link)
    .innerJoin(report, eq(report.id, link.reportId))
    .innerJoin(dataset, eq(dataset.id, report.datasetId))
    .where(and(here, eq(link.id, linkId)))
    .get();
  const over = found && (found.revokedAt !== null || (found.expiresAt !== null && found.expiresAt <= now));
  if (!found || over) return { ok: false, reason: 'unknown' };
  if (!found.allows) return { ok: false, reason: 'not-allowed' };
  const { teamId, hides, blind } = found;
  const read = signatureSchema.safeParse(hides ? '' : signedAs);
  if (!read.success || isNameTaken(db, { name: read.data, teamId, personId, blind }))
    return { ok: false, reason: 'name' };
  return {
    ok: true,
    signature: {
      teamId,
      personId,
      shownPersonId: hides ? null : personId,
      linkId,
      signedAs: read.data || A_REFEREE,
      shownAt: hides ? dayOf(now) : now
    }
  };
}
