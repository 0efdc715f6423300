import { z } from 'zod';
import type { Operation } from '../operation';
import { pageOf, pageQuery } from '../shapes/page';
import { newSweepSchema, sweepEntrySchema, sweepSchema } from '../shapes/sweep';
import { sweepDocumentSchema } from '../shapes/sweep-document';

export const sweepsQuery = z.strictObject({
  ...pageQuery,
  axis: z.enum(['quench-time', 'hold-time']).optional().describe('Over this time alone')
});
export const sweepPageSchema = pageOf(sweepEntrySchema);

const json = (schema: z.ZodType, about: string) => ({ type: 'application/json', schema, about });

export const SWEEP_OPERATIONS: Operation[] = [
  {
    id: 'listSweeps',
    method: 'get',
    path: '/sweeps',
    part: 'Sweeps',
    summary: 'List sweeps',
    about: 'Newest first. What was put aside is not there.',
    scope: 'read',
    query: sweepsQuery,
    answer: { status: 200, about: 'One page', content: json(sweepPageSchema, 'A page of sweeps') }
  },
  {
    id: 'makeSweep',
    method: 'post',
    path: '/sweeps',
    part: 'Sweeps',
    summary: 'Make a sweep of datasets',
    about:
      'Power laws of the cumulants over quench or hold time, the test of one exponent, and ratios beside known laws. It is made while you wait, and kept as it is: later changes of its datasets change nothing in it.',
    scope: 'diagnose',
    once: true,
    bodies: [
      {
        ...json(newSweepSchema, 'Datasets, and how they are to be looked at.'),
        example: {
          name: 'Quench times, May',
          datasets: ['id of a dataset', 'id of another'],
          axis: 'quench-time',
          transition: { dimension: 1, correlation: 1, dynamic: 1 }
        }
      }
    ],
    answer: { status: 201, about: 'Made', content: json(sweepSchema, 'The sweep'), location: true },
    refusals: {
      400: 'The body is not JSON, or did not arrive whole.',
      404: 'The team has no dataset of one of the ids, or it was put aside.',
      409: 'The first request with this key is still being answered.',
      413: 'More than the server takes.',
      415: 'Not application/json.',
      422: 'A field does not fit, or the datasets make no sweep: “detail” says why (fewer than two, a time of zero or none, mixed units, lumped counts). Or the Idempotency-Key came with another request before.'
    }
  },
  {
    id: 'readSweep',
    method: 'get',
    path: '/sweeps/{id}',
    part: 'Sweeps',
    summary: 'Read a sweep',
    scope: 'read',
    idOf: 'sweep',
    answer: { status: 200, about: 'The sweep', content: json(sweepSchema, 'A sweep') }
  },
  {
    id: 'readSweepDocument',
    method: 'get',
    path: '/sweeps/{id}/document.json',
    part: 'Sweeps',
    summary: 'Take the document of a sweep',
    scope: 'read',
    idOf: 'sweep',
    answer: {
      status: 200,
      about: 'The document, byte for byte as it was stored',
      content: json(sweepDocumentSchema, 'severalty.sweep/1')
    }
  },
  {
    id: 'readSweepPoints',
    method: 'get',
    path: '/sweeps/{id}/points.csv',
    part: 'Sweeps',
    summary: 'Take the points of a sweep',
    scope: 'read',
    idOf: 'sweep',
    answer: {
      status: 200,
      about: 'Cumulants, ratios and their intervals, a line each dataset',
      content: { type: 'text/csv', schema: null, about: 'A table' }
    }
  },
  {
    id: 'readSweepPdf',
    method: 'get',
    path: '/sweeps/{id}/sweep.pdf',
    part: 'Sweeps',
    summary: 'Take a sweep for print',
    about: 'Counts as ten requests.',
    scope: 'read',
    idOf: 'sweep',
    answer: {
      status: 200,
      about: 'A tagged PDF; the same sweep gives the same bytes',
      content: { type: 'application/pdf', schema: null, about: 'PDF' }
    },
    refusals: { 500: 'The stored document is damaged; document.json gives its bytes all the same.' }
  }
];
