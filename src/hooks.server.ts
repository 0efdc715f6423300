import { building } from '$app/environment';
import { plainError } from '$lib/model/plain-errors';
import { database } from '$lib/server/application';
import { apiProblems } from '$lib/server/handles/api-problems';
import { firstReading } from '$lib/server/handles/first-reading';
import { issuerFormAction } from '$lib/server/handles/issuer-form-action';
import { preloadFonts } from '$lib/server/handles/preload-fonts';
import { reportError } from '$lib/server/handles/report-error';
import { securityHeaders } from '$lib/server/handles/security-headers';
import { seeRequest } from '$lib/server/handles/see-request';
import { storageTroubleStatus } from '$lib/server/handles/storage-trouble-status';
import { withDatabase } from '$lib/server/handles/with-database';
import { withPerson } from '$lib/server/handles/with-person';
import type { ServerInit } from '@sveltejs/kit';
import { sequence } from '@sveltejs/kit/hooks';
import { z } from 'zod';

// What no schema has words for is told in ours, on pages and to scripts.
z.config({ customError: plainError });

export const init: ServerInit = () => {
  if (!building) database();
};

export const handle = sequence(
  seeRequest,
  securityHeaders,
  apiProblems,
  storageTroubleStatus,
  issuerFormAction,
  withDatabase,
  withPerson,
  preloadFonts,
  firstReading
);

export const handleError = reportError;
