import { z } from 'zod';
import { hardnessSchema } from '../../team/jobs/job-request';
import { JOB_STATUSES } from '../../team/jobs/job-row';
import type { Operation } from '../operation';
import { jobSchema } from '../shapes/job';
import { pageOf, pageQuery } from '../shapes/page';

export const jobsQuery = z.strictObject({
  ...pageQuery,
  dataset: z.string().max(100).optional().describe('Id of a dataset: what was asked for it alone'),
  status: z.enum(JOB_STATUSES).optional().describe('Of this status alone')
});
export const jobPageSchema = pageOf(jobSchema);

export const DIAGNOSIS_OPERATIONS: Operation[] = [
  {
    id: 'askForDiagnosis',
    method: 'post',
    path: '/datasets/{id}/jobs',
    part: 'Diagnoses',
    summary: 'Ask for a diagnosis',
    about:
      'Trials, unit, geometry, misread rate with its uncertainty and counts kept come from the conditions of the dataset. The same diagnosis that still waits or runs is given instead of a second one.',
    scope: 'diagnose',
    idOf: 'dataset',
    once: true,
    bodyIsOptional: true,
    bodies: [
      {
        type: 'application/json',
        schema: hardnessSchema,
        about: 'How hard to look, where it differs from what is usual.',
        example: { resamples: 1999, seed: 1, alpha: 0.01, tolerance: 0.1 }
      }
    ],
    answer: {
      status: 202,
      about: 'Queued; ask for the job until it has ended',
      content: { type: 'application/json', schema: jobSchema, about: 'The job' },
      location: true
    },
    refusals: {
      400: 'The body is not JSON, or did not arrive whole.',
      409: 'The first request with this key is still being answered.',
      413: 'More than the server takes.',
      415: 'Not application/json.',
      422: 'An option does not fit; or the Idempotency-Key came with another request before.'
    }
  },
  {
    id: 'listJobs',
    method: 'get',
    path: '/jobs',
    part: 'Diagnoses',
    summary: 'List diagnoses asked for',
    about: 'By when they were asked for, newest first.',
    scope: 'read',
    query: jobsQuery,
    answer: {
      status: 200,
      about: 'One page',
      content: { type: 'application/json', schema: jobPageSchema, about: 'A page of jobs' }
    }
  },
  {
    id: 'readJob',
    method: 'get',
    path: '/jobs/{id}',
    part: 'Diagnoses',
    summary: 'See how a diagnosis goes',
    about:
      'Once “status” is done, “report” has the id of the report. Until it ends, Retry-After says when to ask again.',
    scope: 'read',
    idOf: 'job',
    answer: {
      status: 200,
      about: 'The job',
      content: { type: 'application/json', schema: jobSchema, about: 'A job' }
    }
  }
];
