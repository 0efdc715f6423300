import { and, asc, eq, isNull, sql } from 'drizzle-orm';
import type { ReportsFile } from '$lib/model/team/transfer/archive-schema';
import type { Database } from '../../db/client';
import { dataset, link, linkVisit, person, remark, report } from '../../db/schema';
import { dayOf } from '../links/day-of';
import { numbered, type NumberedEntries } from './dataset-entries';
import { asText, firstMakers } from './first-makers';

const when = (time: number) => new Date(time).toISOString();
const whenOrNull = (time: number | null) => (time === null ? null : when(time));

/** The reports of the datasets that are exported, and what is kept beside each document. */
export function reportEntries(
  db: Database,
  teamId: string,
  datasets: Map<string, string>
): NumberedEntries & { file: ReportsFile } {
  const rows = db
    .select({
      id: report.id,
      datasetId: report.datasetId,
      number: report.number,
      sha256: report.sha256,
      options: report.options,
      conditions: report.conditions,
      createdAt: report.createdAt,
      name: person.name,
      email: person.email
    })
    .from(report)
    .innerJoin(dataset, eq(dataset.id, report.datasetId))
    .leftJoin(person, eq(person.id, report.createdBy))
    .where(and(eq(report.teamId, teamId), isNull(report.deletedAt), isNull(dataset.deletedAt)))
    .orderBy(asc(report.createdAt), asc(sql`"report".rowid`))
    .all();
  const imported = firstMakers(db, teamId);
  const madeBy: Record<string, string> = {};
  const file = rows.map((row, i): ReportsFile[number] => {
    const path = numbered('reports', i);
    const by =
      imported.get(row.id) ??
      (row.name !== null && row.email !== null ? asText(row.name, row.email) : undefined);
    if (by) madeBy[path] = by;
    const links = linksOf(db, row.id);
    return {
      file: path,
      dataset: datasets.get(row.datasetId) ?? '',
      number: row.number,
      sha256: row.sha256,
      options: JSON.parse(row.options) as ReportsFile[number]['options'],
      conditions: JSON.parse(row.conditions) as ReportsFile[number]['conditions'],
      createdAt: when(row.createdAt),
      remarks: remarksOf(db, row.id, links.places),
      links: links.list
    };
  });
  const entries = rows.map(({ id }, i) => ({
    path: numbered('reports', i),
    bytes: () => {
      const found = db.select({ text: report.document }).from(report).where(eq(report.id, id)).get();
      if (!found) throw new Error('A report was removed while it was being exported.');
      return new TextEncoder().encode(found.text);
    }
  }));
  return { entries, paths: new Map(rows.map(({ id }, i) => [id, numbered('reports', i)])), madeBy, file };
}

function linksOf(db: Database, reportId: string) {
  const rows = db
    .select()
    .from(link)
    .where(eq(link.reportId, reportId))
    .orderBy(asc(link.createdAt), asc(sql`"link".rowid`))
    .all();
  const list = rows.map((row): ReportsFile[number]['links'][number] => ({
    label: row.label,
    audience: row.audience,
    people: JSON.parse(row.people) as string[],
    shows: row.shows,
    blind: row.blind,
    hidesReferees: row.hidesReferees,
    allowsRemarks: row.allowsRemarks,
    visitLimit: row.visitLimit,
    visits: db
      .select({ id: linkVisit.id })
      .from(linkVisit)
      .where(and(eq(linkVisit.linkId, row.id), eq(linkVisit.outcome, 'opened')))
      .all().length,
    createdAt: when(row.createdAt),
    expiresAt: whenOrNull(row.expiresAt),
    revokedAt: whenOrNull(row.revokedAt)
  }));
  return { list, places: new Map(rows.map(({ id }, i) => [id, i])) };
}

/** First remarks stand before their answers. Who came by a link that hides its referees is not named, nor told to the minute. */
function remarksOf(db: Database, reportId: string, links: Map<string, number>) {
  const rows = db
    .select({ row: remark, hidden: link.hidesReferees })
    .from(remark)
    .leftJoin(link, eq(link.id, remark.linkId))
    .where(eq(remark.reportId, reportId))
    .orderBy(asc(remark.createdAt), asc(sql`"remark".rowid`))
    .all();
  const places = new Map(rows.map(({ row }, i) => [row.id, i]));
  return rows.map(({ row, hidden }): ReportsFile[number]['remarks'][number] => ({
    section: row.section,
    body: row.body,
    signedAs: hidden ? 'A referee' : row.signedAs,
    at: when(hidden ? dayOf(row.createdAt) : row.createdAt),
    thread: row.threadId === null ? null : (places.get(row.threadId) ?? null),
    link: row.linkId === null ? null : (links.get(row.linkId) ?? null),
    settledAt: whenOrNull(row.settledAt)
  }));
}
