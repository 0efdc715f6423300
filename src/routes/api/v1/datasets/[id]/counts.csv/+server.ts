import { csvOfDataset } from '$lib/server/services/datasets/csv-of-dataset';
import { datasetById } from '$lib/server/services/datasets/dataset-by-id';
import { attachment } from '../../../../../(team)/team/[team=slug]/datasets/attachment';
import { askToken } from '../../../../../ask-token';
import { problem } from '../../../../../problem';
import { NOT_HERE } from '../../../../answers';
import type { RequestHandler } from './$types';

/** The counts of a dataset as CSV; one that was put aside is not there. */
export const GET: RequestHandler = async (event) => {
  const asked = await askToken(event, 'read');
  if (!asked.ok) return asked.response;
  const { db } = event.locals;
  const found = datasetById(db, asked.actor, event.params.id);
  if (!found.ok || found.dataset.deletedAt !== null) return problem(NOT_HERE);
  const csv = csvOfDataset(db, asked.actor, event.params.id);
  return csv.ok ? attachment(csv.text, csv.name, 'text/csv; charset=utf-8') : problem(NOT_HERE);
};
