import { compareReports } from '$lib/server/services/reports/compare-reports';
import { reportsOfDataset } from '$lib/server/services/reports/reports-of-dataset';
import type { SavedReport } from '$lib/server/services/reports/find-report';
import { error } from '@sveltejs/kit';
import { askTeam } from '../../../../../ask';
import type { PageServerLoad } from './$types';

/** Two reports of one dataset side by side: `?a=ID&b=ID`. */
export const load: PageServerLoad = (event) => {
  const { actor } = askTeam(event, 'see');
  const { db } = event.locals;
  const [a, b] = ['a', 'b'].map((name) => event.url.searchParams.get(name) ?? '');
  const compared = compareReports(db, actor, a, b);
  if (!compared.ok) {
    if (compared.reason === 'unknown')
      error(404, { message: 'There is no page at this address.', code: 'not-found' });
    if (compared.reason === 'unreadable')
      error(500, {
        message: `They cannot be compared: the document of ${compared.problem}. Its bytes can still be taken from its page.`,
        code: 'unreadable'
      });
    error(400, {
      message:
        compared.reason === 'same'
          ? 'Choose two different reports: this is one and the same.'
          : 'These reports are of two datasets. Only reports of one dataset can be set side by side.',
      code: compared.reason
    });
  }
  const { first, second, comparison } = compared;
  const head = ({ id, number, by, createdAt, engineVersion, verdict }: SavedReport) => ({
    id,
    number,
    by,
    createdAt,
    engineVersion,
    verdict
  });
  return {
    dataset: { id: first.datasetId, name: first.conditionsNow.name },
    first: head(first),
    second: head(second),
    comparison,
    reports: reportsOfDataset(db, actor, first.datasetId)
  };
};
