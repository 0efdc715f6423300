import type { Handle } from '@sveltejs/kit';

/** A locked database or a full disk is not an error of the program: 503, and when to try again. Kit itself says 500. */
export const storageTroubleStatus: Handle = async ({ event, resolve }) => {
  const response = await resolve(event);
  if (!event.locals.storageTrouble || response.status !== 500) return response;
  const headers = new Headers(response.headers);
  headers.set('retry-after', '5');
  return new Response(response.body, { status: 503, headers });
};
