import { printedQuote } from '$lib/model/quote/printed-quote';
import type { ReadDocument } from '$lib/model/read-document';
import { can } from '$lib/server/access/can';
import type { SavedReport } from '$lib/server/services/reports/find-report';
import { putReportAside } from '$lib/server/services/reports/put-report-aside';
import { readReport } from '$lib/server/services/reports/read-report';
import { reportsOfDataset } from '$lib/server/services/reports/reports-of-dataset';
import { warmPdf } from '$lib/server/services/reports/warm-pdf';
import { remarksOf } from '$lib/server/services/remarks/remarks-of';
import { error, redirect, type RequestEvent } from '@sveltejs/kit';
import { askTeam } from '../../../../../ask';
import { remarkAction, settleAction } from '../../../../../remark-actions';
import type { Actions, PageServerLoad } from './$types';

const gone = (): never => error(404, { message: 'There is no page at this address.', code: 'not-found' });

export const load: PageServerLoad = (event) => {
  const { actor, team } = askTeam(event, 'see');
  const { db } = event.locals;
  const read = readReport(db, actor, event.params.id);
  if (!read.ok) return gone();
  const { text, ...report } = read.report;
  warmPdf(report, read.document);
  const may = (action: 'delete' | 'link' | 'remark') =>
    can({ kind: 'member', ...actor }, action, { createdBy: report.createdBy });
  return {
    report: { ...report, bytes: Buffer.byteLength(text) },
    document: withQuote(read.document, report, team.name),
    threads: remarksOf(db, { reportId: report.id, via: 'team', actor }),
    others: reportsOfDataset(db, actor, report.datasetId).filter(({ id }) => id !== report.id),
    may: { aside: may('delete'), link: may('link'), remark: may('remark') }
  };
};

type Frozen = Omit<SavedReport, 'text'>;

/** A document that can be read, with the words to quote of it. */
function withQuote(document: ReadDocument, report: Frozen, team: string) {
  if (!document.ok) return document;
  const { name, device, firmware, group } = report.conditions;
  const { number, createdAt: madeAt, sha256 } = report;
  const from = { name, device, firmware, group, team, number, madeAt, sha256, url: null };
  return { ...document, quote: printedQuote(document.diagnosis, from) };
}

type Event = RequestEvent<{ team: string; id: string }>;

function placeOf(event: Event) {
  const { team, actor } = askTeam(event, 'remark');
  const reportId = event.params.id;
  const address = `${event.url.origin}/team/${team.slug}/reports/${reportId}`;
  return { db: event.locals.db, author: { kind: 'member' as const, actor }, reportId, address };
}

export const actions: Actions = {
  remark: async (event) => remarkAction(placeOf(event), await event.request.formData()),
  settle: async (event) => settleAction(placeOf(event), await event.request.formData()),

  aside: (event) => {
    const { actor, team } = askTeam(event, 'see');
    const read = readReport(event.locals.db, actor, event.params.id);
    if (!read.ok) return gone();
    askTeam(event, 'delete', { createdBy: read.report.createdBy });
    if (!putReportAside(event.locals.db, actor, event.params.id).ok) return gone();
    redirect(303, `/team/${team.slug}/reports?aside=${event.params.id}`);
  }
};
