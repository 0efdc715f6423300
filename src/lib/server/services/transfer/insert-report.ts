import { newToken } from '../../auth/new-token';
import type { Database } from '../../db/client';
import { newId } from '../../db/new-id';
import { link, remark, report } from '../../db/schema';
import { recordEvent } from '../events/record-event';
import type { ImportContext } from './insert-dataset';
import type { ReadReport } from './read-archive';

const timeOrNull = (text: string | null) => (text === null ? null : Date.parse(text));

/** Adds a report of an archive with its remarks. Its links are kept for the record, closed: nobody has their tokens. */
export function insertReport(
  tx: Pick<Database, 'insert'>,
  { about, text, document }: ReadReport,
  datasetId: string,
  { teamId, personId, madeBy, now }: ImportContext
): void {
  const id = newId();
  tx.insert(report)
    .values({
      id,
      teamId,
      datasetId,
      number: about.number,
      document: text,
      sha256: about.sha256,
      options: JSON.stringify(about.options),
      engineVersion: document.engine.version,
      verdict: document.answer.verdict,
      conditions: JSON.stringify(about.conditions),
      createdBy: null,
      createdAt: Date.parse(about.createdAt)
    })
    .run();
  const linkIds = about.links.map((it) => {
    const linkId = newId();
    tx.insert(link)
      .values({
        id: linkId,
        teamId,
        reportId: id,
        tokenHash: newToken().hash,
        label: it.label,
        audience: it.audience,
        people: JSON.stringify(it.people),
        shows: it.shows,
        blind: it.blind,
        hidesReferees: it.hidesReferees,
        allowsRemarks: it.allowsRemarks,
        visitLimit: it.visitLimit,
        createdAt: Date.parse(it.createdAt),
        expiresAt: timeOrNull(it.expiresAt),
        revokedAt: timeOrNull(it.revokedAt) ?? now
      })
      .run();
    return linkId;
  });
  const remarkIds: string[] = [];
  for (const it of about.remarks) {
    const remarkId = newId();
    remarkIds.push(remarkId);
    tx.insert(remark)
      .values({
        id: remarkId,
        reportId: id,
        section: it.section,
        threadId: it.thread === null ? null : remarkIds[it.thread],
        body: it.body,
        linkId: it.link === null ? null : linkIds[it.link],
        personId: null,
        signedAs: it.signedAs,
        createdAt: Date.parse(it.at),
        settledAt: timeOrNull(it.settledAt)
      })
      .run();
  }
  const detail = { number: about.number, madeBy: madeBy[about.file] ?? null };
  recordEvent(tx, { action: 'report.import', teamId, personId, thing: id, detail }, now);
}
