import { can } from '$lib/server/access/can';
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
  const { actor } = askTeam(event, 'see');
  const { db } = event.locals;
  const read = readReport(db, actor, event.params.id);
  if (!read.ok) return gone();
  const { text, ...report } = read.report;
  warmPdf(report, read.document);
  const may = (action: 'delete' | 'link' | 'remark') =>
    can({ kind: 'member', ...actor }, action, { createdBy: report.createdBy });
  return {
    report: { ...report, bytes: Buffer.byteLength(text) },
    document: read.document,
    threads: remarksOf(db, { reportId: report.id, via: 'team', actor }),
    others: reportsOfDataset(db, actor, report.datasetId).filter(({ id }) => id !== report.id),
    may: { aside: may('delete'), link: may('link'), remark: may('remark') }
  };
};

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
