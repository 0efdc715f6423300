import { datasetPageSchema, datasetsQuery } from '$lib/model/api/operations/datasets';
import { isoMoment } from '$lib/model/api/shapes/moment';
import { newDatasetQuery, statedConditions } from '$lib/model/api/shapes/new-dataset';
import { toDataset } from '$lib/model/api/to-dataset';
import { datasetById } from '$lib/server/services/datasets/dataset-by-id';
import { pageOfDatasets } from '$lib/server/services/datasets/page-of-datasets';
import { uploadDataset } from '$lib/server/services/datasets/upload-dataset';
import { uploadJson, type UploadedJson } from '$lib/server/services/datasets/upload-json';
import { askToken } from '../../../ask-token';
import { problem } from '../../../problem';
import { BAD_CURSOR, nextPage, readQuery, told } from '../../answers';
import { posted } from '../../posted';
import { uploadRefusal } from '../../upload-refusal';
import type { RequestHandler } from './$types';

/** A page of the team's datasets. */
export const GET: RequestHandler = async (event) => {
  const asked = await askToken(event, 'read');
  if (!asked.ok) return asked.response;
  const read = readQuery(event.url, datasetsQuery);
  if (!read.ok) return read.response;
  const found = pageOfDatasets(event.locals.db, asked.actor, read.query);
  if (!found.ok) return problem(BAD_CURSOR);
  const { entries, next } = found.page;
  const data = entries.map((entry) => ({ ...entry, createdAt: isoMoment(entry.createdAt) }));
  return told(datasetPageSchema, { data, next }, { headers: nextPage(event.url, next) });
};

/** Saves the one dataset of the body: a plain file with its conditions in the query, or JSON with both. */
export const POST: RequestHandler = async (event) => {
  const asked = await askToken(event, 'upload');
  if (!asked.ok) return asked.response;
  const { db } = event.locals;
  const { actor } = asked;
  const isJson = event.request.headers.get('content-type')?.toLowerCase().startsWith('application/json');
  const read = readQuery(event.url, newDatasetQuery);
  if (!read.ok) return read.response;
  if (isJson && event.url.search !== '')
    return problem({ status: 422, code: 'bad-query', title: 'With JSON, conditions stand in the body.' });
  const { format, ...stated } = read.query;
  return posted(event, asked, (bytes, type) => {
    let uploaded: UploadedJson;
    if (type === 'application/json') uploaded = uploadJson(db, actor, bytes);
    else if (type === 'text/csv') {
      const fileName = `${stated.name ?? 'counts'}.csv`;
      const upload = { fileName, bytes, choices: { format }, stated: statedConditions(stated) };
      uploaded = uploadDataset(db, actor, { ...upload, columnsState: true });
    } else {
      const title = 'Send the counts as text/csv or application/json, and say which in Content-Type.';
      return { refused: { status: 415, code: 'wrong-type', title } };
    }
    if (!uploaded.ok) return { refused: uploadRefusal(uploaded) };
    const saved = datasetById(db, actor, uploaded.id);
    if (!saved.ok) return { refused: uploadRefusal({ ok: false, reason: 'not-allowed' }) };
    const body = JSON.stringify(toDataset(saved.dataset));
    return { done: { status: 201, location: `/api/v1/datasets/${uploaded.id}`, body } };
  });
};
