import { WATCHED_KINDS, type Watched } from '$lib/model/watches/watch-form';
import type { Database } from '../../db/client';
import type { Message } from '../../mail/send-mail';
import type { News, TeamNews } from './claim-news';
import { newsLine } from './news-line';
import { unsubscribeToken } from './unsubscribe-token';
import { kindOf } from './watch-about';

/** Lines of one kind in one mail; a thousand diagnoses are told by their number and the latest of them. */
const MOST = 20;

const REST: Record<Watched, { words: string; path: string }> = {
  'gate-fail': { words: 'more failed gates', path: 'devices' },
  remark: { words: 'more remarks', path: 'reports' },
  'job-end': { words: 'more diagnoses that ended', path: 'jobs' }
};

/** The mail that tells somebody what is new in their teams: one for all of them. */
export function newsLetter(
  db: Database,
  { personId, email, teams }: News,
  { origin, serverSecret }: { origin: string; serverSecret: string }
): Message {
  const lines = teams.flatMap((team) => team.events.map((event) => ({ team, event })));
  const first = newsLine(db, lines[0].team, lines[0].event, origin);
  const where = teams.map(({ name }) => name).join(', ');
  const teamId = teams.length === 1 ? teams[0].teamId : null;
  const unsubscribe = `${origin}/unsubscribe/${unsubscribeToken({ personId, teamId }, serverSecret)}`;
  return {
    to: email,
    subject: lines.length === 1 ? `${first.words} (${where})` : `${lines.length} things happened in ${where}`,
    text: [
      ...teams.map((team) => partOf(db, team, origin)),
      `You chose to hear of this at ${origin}/account/mail, and can change it there.\nTo end this mail without signing in: ${unsubscribe}\n`
    ].join('\n\n'),
    unsubscribe
  };
}

function partOf(db: Database, team: TeamNews, origin: string): string {
  const parts = WATCHED_KINDS.flatMap((kind) => {
    const events = team.events.filter(({ action }) => kindOf(action) === kind);
    // The latest are shown, oldest first.
    const shown = events.slice(-MOST).map((event) => newsLine(db, team, event, origin));
    const left = events.length - shown.length;
    const { words, path } = REST[kind];
    return [
      ...(left > 0 ? [`${left} ${words} before these:\n${origin}/team/${team.slug}/${path}`] : []),
      ...shown.map(({ words: said, address }) => `${said}:\n${address}`)
    ];
  });
  return [`In ${team.name}`, ...parts].join('\n\n');
}
