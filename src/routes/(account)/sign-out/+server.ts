import { endSession } from '$lib/server/auth/begin-session';
import { redirect } from '@sveltejs/kit';
import { openToAll } from '../../ask';
import type { RequestHandler } from './$types';

/** Ends the session of this browser; only by POST, so that no link or picture can. */
export const POST: RequestHandler = async (event) => {
  openToAll();
  await endSession(event);
  redirect(303, '/');
};
