import { z } from 'zod';
import { diagnosisSchema } from '../../diagnosis-schema';
import type { Operation } from '../operation';
import { pageOf, pageQuery } from '../shapes/page';
import { reportEntrySchema, reportSchema } from '../shapes/report';

export const reportsQuery = z.strictObject({
  ...pageQuery,
  dataset: z.string().max(100).optional().describe('Id of a dataset: its reports alone')
});
export const reportPageSchema = pageOf(reportEntrySchema);

const one = { method: 'get', part: 'Reports', scope: 'read', idOf: 'report' } as const;
const damaged = { 500: 'The stored document is damaged; document.json gives its bytes all the same.' };

export const REPORT_OPERATIONS: Operation[] = [
  {
    id: 'listReports',
    method: 'get',
    path: '/reports',
    part: 'Reports',
    summary: 'List reports',
    about: 'Newest first. What was put aside is not there.',
    scope: 'read',
    query: reportsQuery,
    answer: {
      status: 200,
      about: 'One page',
      content: { type: 'application/json', schema: reportPageSchema, about: 'A page of reports' }
    }
  },
  {
    ...one,
    id: 'readReport',
    path: '/reports/{id}',
    summary: 'Read a report',
    answer: {
      status: 200,
      about: 'The report',
      content: { type: 'application/json', schema: reportSchema, about: 'A report' }
    }
  },
  {
    ...one,
    id: 'readDocument',
    path: '/reports/{id}/document.json',
    summary: 'Take the diagnosis document',
    about: 'Everything the report says, the same bytes as on its page and from the command line.',
    answer: {
      status: 200,
      about: 'The document, byte for byte as it was stored',
      content: { type: 'application/json', schema: diagnosisSchema, about: 'severalty.diagnosis/1' }
    }
  },
  {
    ...one,
    id: 'readNumbers',
    path: '/reports/{id}/numbers.csv',
    summary: 'Take every number as CSV',
    answer: {
      status: 200,
      about: 'One number a line: part, item, count, value, low, high; RFC 4180',
      content: { type: 'text/csv', schema: null, about: 'CSV' }
    },
    refusals: damaged
  },
  {
    ...one,
    id: 'readDistribution',
    path: '/reports/{id}/distribution.csv',
    summary: 'Take the distribution as CSV',
    answer: {
      status: 200,
      about: 'One count a line: shots, share with its interval, best law; RFC 4180',
      content: { type: 'text/csv', schema: null, about: 'CSV' }
    },
    refusals: damaged
  },
  {
    ...one,
    id: 'readTails',
    path: '/reports/{id}/tails.csv',
    summary: 'Take both tails as CSV',
    answer: {
      status: 200,
      about: 'One tail a line: shots, share with its interval, best law, bounds; RFC 4180',
      content: { type: 'text/csv', schema: null, about: 'CSV' }
    },
    refusals: damaged
  },
  {
    ...one,
    id: 'readBundle',
    path: '/reports/{id}/bundle.zip',
    summary: 'Take everything in one file',
    about:
      'The document, its tables, charts, the report for print, the counts, and how to compute it again. Counts as ten requests.',
    answer: {
      status: 200,
      about: 'A zip with checksums of what is in it; the same report gives the same bytes',
      content: { type: 'application/zip', schema: null, about: 'Zip' }
    },
    refusals: damaged
  },
  {
    ...one,
    id: 'readPdf',
    path: '/reports/{id}/report.pdf',
    summary: 'Take the report for print',
    about: 'Counts as ten requests.',
    answer: {
      status: 200,
      about: 'A tagged PDF; the same report gives the same bytes',
      content: { type: 'application/pdf', schema: null, about: 'PDF' }
    },
    refusals: damaged
  }
];
