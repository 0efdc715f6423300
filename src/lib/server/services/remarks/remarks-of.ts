import type { RemarkSection } from '$lib/model/team/remarks/sections';
import type { RemarkView, ThreadView } from '$lib/model/team/remarks/threads';
import { and, asc, eq, isNull, sql } from 'drizzle-orm';
import { alias } from 'drizzle-orm/sqlite-core';
import type { Database } from '../../db/client';
import { link, membership, person, remark, report } from '../../db/schema';
import type { Actor } from '../access/actor';
import { mayWhere } from '../access/may-where';
import { dayOf } from '../links/day-of';
import { A_REFEREE } from './remark-author';
import { THE_TEAM } from './the-team';

/**
 * Whose remarks are asked for. By link only threads begun through that same link come back, with the team's answers
 * in them: what the team says among itself, and what other referees say, is not for its readers. The caller has opened
 * the link; `viewer` is who is signed in there.
 */
export type RemarksOf =
  | { reportId: string; via: 'team'; actor: Actor }
  | { reportId: string; via: { linkId: string }; viewer?: string | null };

/**
 * The threads of a report, oldest first, with names as the reader may know them: readers by a blind link get "The team"
 * for every member, and the team gets "A referee" and the day alone where the link hides referees.
 */
export function remarksOf(db: Database, asked: RemarksOf): ThreadView[] {
  const linkId = asked.via === 'team' ? null : asked.via.linkId;
  const viewer =
    asked.via === 'team' ? asked.actor.personId : ((asked as { viewer?: string | null }).viewer ?? null);
  const allowed =
    asked.via === 'team'
      ? and(mayWhere(asked.actor, 'see', report.teamId), isNull(report.deletedAt))
      : sql`exists (select 1 from link l where l.id = ${asked.via.linkId} and l.report_id = ${report.id})`;
  const rows = rowsOf(db, and(eq(remark.reportId, asked.reportId), allowed));
  const roots = rows.filter((row) => row.threadId === null && (linkId === null || row.linkId === linkId));
  const blind = linkId !== null && blindLink(db, linkId);

  const view = (row: Row): RemarkView => {
    const from = row.linkId === null ? 'team' : 'link';
    const by = row.hides ? A_REFEREE : from === 'team' && blind ? THE_TEAM : row.signedAs;
    return {
      id: row.id,
      body: row.body,
      by,
      from,
      typed: from === 'link' && row.personId === null && by !== A_REFEREE,
      mine: viewer !== null && row.personId === viewer,
      createdAt: row.hides && linkId === null ? dayOf(row.createdAt) : row.createdAt
    };
  };
  const settler = (row: Row): string => {
    if (row.settledByMember) return blind ? THE_TEAM : (row.settledBy ?? THE_TEAM);
    // Nobody is noted where the link hides referees; otherwise a member or referee who is gone.
    if (row.settledBy !== null && !row.hides && !blind) return row.settledBy;
    return row.linkId === null ? 'Somebody who has left' : A_REFEREE;
  };
  // Settled by nobody who was noted: by a referee whom the link hides.
  const settledAt = (row: Row, at: number): number =>
    row.hides && row.settledBy === null && linkId === null ? dayOf(at) : at;
  return roots.map((root) => ({
    id: root.id,
    section: root.section as RemarkSection,
    remarks: rows.filter((row) => row.id === root.id || row.threadId === root.id).map(view),
    settled: root.settledAt === null ? null : { at: settledAt(root, root.settledAt), by: settler(root) },
    link:
      linkId === null && root.label !== null
        ? { label: root.label, blind: root.blind ?? false, hidesReferees: root.hides ?? false }
        : null
  }));
}

type Row = ReturnType<typeof rowsOf>[number];

function rowsOf(db: Database, where: ReturnType<typeof and>) {
  const settler = alias(person, 'settler');
  return db
    .select({
      id: remark.id,
      threadId: remark.threadId,
      section: remark.section,
      body: remark.body,
      linkId: remark.linkId,
      personId: remark.personId,
      signedAs: remark.signedAs,
      createdAt: remark.createdAt,
      settledAt: remark.settledAt,
      settledBy: settler.name,
      settledByMember: sql<number>`exists (select 1 from ${membership} where ${membership.teamId} = ${report.teamId}
        and ${membership.personId} = ${remark.settledBy})`,
      label: link.label,
      blind: link.blind,
      hides: link.hidesReferees
    })
    .from(remark)
    .innerJoin(report, eq(report.id, remark.reportId))
    .leftJoin(link, eq(link.id, remark.linkId))
    .leftJoin(settler, eq(settler.id, remark.settledBy))
    .where(where)
    .orderBy(asc(remark.createdAt), asc(sql`${remark}.rowid`))
    .all();
}

function blindLink(db: Database, linkId: string): boolean {
  return db.select({ blind: link.blind }).from(link).where(eq(link.id, linkId)).get()?.blind ?? true;
}
