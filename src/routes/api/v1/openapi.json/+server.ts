import { openApi } from '$lib/model/api/open-api';
import { openToAll } from '../../../ask';
import type { RequestHandler } from './$types';

/** The API described for programs (OpenAPI 3.1); open to all, as its page is. */
export const GET: RequestHandler = () => {
  openToAll();
  return new Response(JSON.stringify(openApi()), {
    headers: { 'content-type': 'application/json', 'cache-control': 'public, max-age=300' }
  });
};
