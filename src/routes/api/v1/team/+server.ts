import { isoMoment } from '$lib/model/api/shapes/moment';
import { teamSchema } from '$lib/model/api/shapes/team';
import { askToken } from '../../../ask-token';
import { told } from '../../answers';
import type { RequestHandler } from './$types';

/** The team that the token opens, and what the token may do. */
export const GET: RequestHandler = async (event) => {
  const asked = await askToken(event, 'read');
  if (!asked.ok) return asked.response;
  const { slug, name } = asked.team;
  const { role, token } = asked.actor;
  const { scopes, expiresAt } = asked;
  return told(teamSchema, {
    slug,
    name,
    token: { name: token.name, role, scopes, expiresAt: isoMoment(expiresAt) }
  });
};
