import { and, asc, eq, isNull, ne, or, sql } from 'drizzle-orm';
import type { Database } from '../../db/client';
import { dataset, link, membership, person, remark, report, team } from '../../db/schema';
import { watchesRemarks } from '../watches/watches-remarks';
import { isDue } from './is-due';

/** A remark as the mail about it needs it. */
export interface ToldRemark {
  section: string;
  body: string;
  signedAs: string;
  fromTeam: boolean;
  /** Label of the link it came by, for members; null for the team's own. */
  label: string | null;
  number: number;
  dataset: string;
  team: string;
}

/** Somebody to tell; `blind` for one who came by a blind link. */
export interface Reader {
  email: string;
  member: boolean;
  blind: boolean;
}

/**
 * Whom a new remark concerns: the maker of the report while a member, and the earlier authors of the thread, members
 * while they are, others while their link is open. Each once, never the author, nobody who is disabled.
 *
 * Members who watch the remarks of the team are mailed by their watch, and not twice.
 *
 * Of remarks by a link the maker hears once an hour, and the authors of a thread once an hour about it: whoever has an
 * open link must not fill their mail.
 */
export function readersOf(
  db: Database,
  remarkId: string,
  now: number
): { remark: ToldRemark; readers: Reader[] } | undefined {
  const found = db
    .select({
      reportId: remark.reportId,
      threadId: remark.threadId,
      personId: remark.personId,
      linkId: remark.linkId,
      teamId: report.teamId,
      madeBy: report.createdBy,
      section: remark.section,
      body: remark.body,
      signedAs: remark.signedAs,
      number: report.number,
      dataset: dataset.name,
      team: team.name,
      label: link.label
    })
    .from(remark)
    .innerJoin(report, eq(report.id, remark.reportId))
    .innerJoin(dataset, eq(dataset.id, report.datasetId))
    .innerJoin(team, eq(team.id, report.teamId))
    .leftJoin(link, eq(link.id, remark.linkId))
    .where(eq(remark.id, remarkId))
    .get();
  if (!found) return undefined;
  const { teamId, madeBy, personId, threadId, linkId } = found;
  const due = (within?: string): boolean => linkId === null || isDue(momentsOf(db, linkId, remarkId, within));

  const readers = new Map<string, Reader>();
  const add = (id: string | null, reader: Reader | undefined): void => {
    if (id === null || id === personId || !reader || readers.has(id)) return;
    if (reader.member && watchesRemarks(db, id, teamId)) return;
    readers.set(id, reader);
  };
  const asMember = (id: string | null): Reader | undefined => {
    if (id === null) return undefined;
    const row = db
      .select({ email: person.email })
      .from(person)
      .innerJoin(membership, and(eq(membership.personId, person.id), eq(membership.teamId, teamId)))
      .where(and(eq(person.id, id), isNull(person.disabledAt)))
      .get();
    return row && { email: row.email, member: true, blind: false };
  };
  if (due()) add(madeBy, asMember(madeBy));
  if (threadId !== null && due(threadId))
    for (const author of authorsOf(db, threadId, remarkId, now))
      if (author.personId !== madeBy || linkId === null)
        add(author.personId, asMember(author.personId) ?? author.reader);
  return { remark: { ...found, fromTeam: found.linkId === null }, readers: [...readers.values()] };
}

/** When remarks came by a link, up to one of them; in one thread, its answers alone: the first had nobody to tell. */
function momentsOf(db: Database, linkId: string, upTo: string, threadId?: string): number[] {
  const rows = db
    .select({ id: remark.id, at: remark.createdAt })
    .from(remark)
    .where(and(eq(remark.linkId, linkId), threadId === undefined ? undefined : eq(remark.threadId, threadId)))
    .orderBy(asc(remark.createdAt), asc(sql`${remark}.rowid`))
    .all();
  return rows.slice(0, rows.findIndex(({ id }) => id === upTo) + 1).map(({ at }) => at);
}

/** Earlier authors of a thread; `reader` is set for those whose remark came through a link that is still open. */
function authorsOf(db: Database, threadId: string, but: string, now: number) {
  const thread = or(eq(remark.id, threadId), eq(remark.threadId, threadId));
  const open = sql<number>`(${link.revokedAt} is null and (${link.expiresAt} is null or ${link.expiresAt} > ${now}))`;
  return db
    .select({ personId: remark.personId, email: person.email, blind: link.blind, open })
    .from(remark)
    .innerJoin(person, eq(person.id, remark.personId))
    .leftJoin(link, eq(link.id, remark.linkId))
    .where(and(thread, ne(remark.id, but), isNull(person.disabledAt)))
    .all()
    .map(({ personId, email, blind, open }) => ({
      personId,
      reader: blind !== null && open ? { email, member: false, blind } : undefined
    }));
}
