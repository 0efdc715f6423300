import { sampleBySlug } from '$lib/server/services/samples';
import { openToAll } from '../../ask';
import { error, json } from '@sveltejs/kit';
import type { RequestHandler } from './$types';

/** One sample file with what its form needs: `{text, trials, unit, geometry, fileName}`. */
export const GET: RequestHandler = ({ locals, params }) => {
  openToAll();
  const found = sampleBySlug(locals.db, params.slug);
  if (!found.ok) error(404, { message: 'There is no sample of that name.', code: 'unknown-sample' });
  const { text, trials, unit, geometry, fileName } = found.sample;
  return json(
    { text, trials, unit, geometry, fileName },
    { headers: { 'cache-control': 'public, max-age=300' } }
  );
};
