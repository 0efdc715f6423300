import { datasetSchema } from '$lib/model/api/shapes/dataset';
import { toDataset } from '$lib/model/api/to-dataset';
import { datasetById } from '$lib/server/services/datasets/dataset-by-id';
import { askToken } from '../../../../ask-token';
import { problem } from '../../../../problem';
import { NOT_HERE, told } from '../../../answers';
import type { RequestHandler } from './$types';

/** A dataset with its conditions and counts; one that was put aside is not there. */
export const GET: RequestHandler = async (event) => {
  const asked = await askToken(event, 'read');
  if (!asked.ok) return asked.response;
  const found = datasetById(event.locals.db, asked.actor, event.params.id);
  if (!found.ok || found.dataset.deletedAt !== null) return problem(NOT_HERE);
  return told(datasetSchema, toDataset(found.dataset));
};
