import type { Operation } from './operation';
import { DATASET_OPERATIONS } from './operations/datasets';
import { DEVICE_OPERATIONS } from './operations/devices';
import { DIAGNOSIS_OPERATIONS } from './operations/diagnoses';
import { REPORT_OPERATIONS } from './operations/reports';
import { SITE_MAP_OPERATIONS } from './operations/site-maps';
import { SWEEP_OPERATIONS } from './operations/sweeps';
import { WEBHOOK_OPERATIONS } from './operations/webhooks';
import { teamSchema } from './shapes/team';

/** Every operation of /api/v1, in the order of its page. */
export const OPERATIONS: Operation[] = [
  {
    id: 'readTeam',
    method: 'get',
    path: '/team',
    part: 'Team',
    summary: 'See what a token opens',
    scope: 'read',
    answer: {
      status: 200,
      about: 'The team and the token',
      content: { type: 'application/json', schema: teamSchema, about: 'The team' }
    }
  },
  ...DATASET_OPERATIONS,
  ...DIAGNOSIS_OPERATIONS,
  ...REPORT_OPERATIONS,
  ...SWEEP_OPERATIONS,
  ...SITE_MAP_OPERATIONS,
  ...DEVICE_OPERATIONS,
  ...WEBHOOK_OPERATIONS
];
