import { z } from 'zod';
import type { Operation } from '../operation';
import { datasetEntrySchema, datasetSchema } from '../shapes/dataset';
import { newDatasetQuery, newDatasetSchema } from '../shapes/new-dataset';
import { pageOf, pageQuery } from '../shapes/page';

export const datasetsQuery = z.strictObject({
  ...pageQuery,
  device: z.string().max(200).optional().describe('Of this device alone'),
  firmware: z.string().max(200).optional().describe('Of this firmware version alone'),
  group: z.string().max(200).optional().describe('Of this group of the device alone'),
  digest: z
    .string()
    .max(100)
    .optional()
    .describe('With these very counts: the digest of a diagnosis document')
});
export const datasetPageSchema = pageOf(datasetEntrySchema);

export const DATASET_OPERATIONS: Operation[] = [
  {
    id: 'listDatasets',
    method: 'get',
    path: '/datasets',
    part: 'Datasets',
    summary: 'List datasets',
    about: 'Newest first. What was put aside is not there.',
    scope: 'read',
    query: datasetsQuery,
    answer: {
      status: 200,
      about: 'One page',
      content: { type: 'application/json', schema: datasetPageSchema, about: 'A page of datasets' }
    }
  },
  {
    id: 'uploadDataset',
    method: 'post',
    path: '/datasets',
    part: 'Datasets',
    summary: 'Upload a dataset',
    about:
      'One histogram or shot list. A plain file is read as on the first page, with the conditions its columns state; those in the query come before them. The body is kept byte for byte.',
    scope: 'upload',
    once: true,
    query: newDatasetQuery,
    bodies: [
      {
        type: 'text/csv',
        schema: null,
        about: 'Two columns, count and shots; or one count a line; or columns shot, batch, count.',
        example: 'count,shots\n0,30\n1,50\n2,20\n'
      },
      {
        type: 'application/json',
        schema: newDatasetSchema,
        about: 'Counts and conditions together; the query stays empty.',
        example: {
          name: 'Chain 7, Tuesday',
          counts: { '0': 30, '1': 50, '2': 20 },
          conditions: { device: 'Marram', trials: 12, quenchTime: 2.5, quenchUnit: 'µs' }
        }
      }
    ],
    answer: {
      status: 201,
      about: 'Saved',
      content: { type: 'application/json', schema: datasetSchema, about: 'The dataset' },
      location: true
    },
    refusals: {
      400: 'The body is not JSON, or did not arrive whole.',
      409: 'The same counts from the same bytes are saved already (“already” names them), or the first request with this key is still being answered.',
      413: 'More than 20 MB.',
      415: 'Neither text/csv nor application/json.',
      422: 'The counts or conditions do not fit: “errors” gives line and reason. Or the Idempotency-Key came with another request before.'
    }
  },
  {
    id: 'readDataset',
    method: 'get',
    path: '/datasets/{id}',
    part: 'Datasets',
    summary: 'Read a dataset',
    scope: 'read',
    idOf: 'dataset',
    answer: {
      status: 200,
      about: 'The dataset',
      content: { type: 'application/json', schema: datasetSchema, about: 'A dataset' }
    }
  },
  {
    id: 'readCounts',
    method: 'get',
    path: '/datasets/{id}/counts.csv',
    part: 'Datasets',
    summary: 'Take the counts as CSV',
    about: 'A file that uploads to the same counts again; a shot list keeps its order.',
    scope: 'read',
    idOf: 'dataset',
    answer: {
      status: 200,
      about: 'The counts; RFC 4180',
      content: { type: 'text/csv', schema: null, about: 'CSV' }
    }
  }
];
