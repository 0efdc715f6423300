import { capital } from '$lib/model/capital';
import type { Database } from '../../db/client';
import { nameOf } from '../events/list-events';
import { thingName } from '../events/thing-name';
import type { NewsEvent, TeamNews } from './claim-news';

/**
 * One event in one sentence, with the address of what it is about. Who came by a link that hides its referees is
 * "A referee" here as everywhere.
 */
export function newsLine(
  db: Database,
  { teamId, slug }: Pick<TeamNews, 'teamId' | 'slug'>,
  { action, thing, detail: text, linkId, ...by }: NewsEvent,
  origin: string
): { words: string; address: string } {
  const detail = text === null ? {} : (JSON.parse(text) as Record<string, unknown>);
  const root = `${origin}/team/${slug}`;
  const name = () => thingName(db, teamId, { action, thing, detail, linkId });
  switch (action) {
    case 'gate.fail':
      return {
        words: `Version “${detail.version}” of ${detail.device} failed its gate`,
        address: `${root}/devices/${detail.deviceId}/versions/${thing}`
      };
    case 'remark.add':
      return {
        words: `${nameOf(action, { linkId, ...by }) ?? 'Somebody'} remarked on ${name() ?? 'a report'}`,
        address: `${root}/reports/${thing}`
      };
    case 'report.make':
      return {
        words: `${capital(name() ?? 'a report')} was made`,
        address: `${root}/reports/${thing}`
      };
    default:
      return { words: `${capital(name() ?? 'a diagnosis')} failed`, address: `${root}/jobs` };
  }
}
