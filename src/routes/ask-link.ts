import { can } from '$lib/server/access/can';
import { openLink, type LinkRefusal, type OpenLink } from '$lib/server/services/links/open-link';
import { error, type RequestEvent } from '@sveltejs/kit';
import { problem } from './problem';

type Event = Pick<RequestEvent, 'locals' | 'cookies' | 'url'> & { params: Partial<Record<string, string>> };
type Opened = Extract<OpenLink, { ok: true }>;
type Refusal = LinkRefusal | 'not-allowed';

/** What a link may be asked for. */
export type LinkAction = 'see' | 'remark';

const WORDS: Record<Refusal, { status: number; message: string }> = {
  unknown: { status: 404, message: 'There is no page at this address.' },
  'sign-in': { status: 401, message: 'This link opens for people who sign in.' },
  'not-named': { status: 403, message: 'This link was made for somebody at another address.' },
  'not-in-team': { status: 403, message: 'This link opens for members of the team alone.' },
  'not-allowed': { status: 403, message: 'This link does not allow that.' },
  expired: { status: 410, message: 'This link has expired.' },
  revoked: { status: 410, message: 'This link was closed.' },
  'used-up': { status: 410, message: 'This link was opened as often as it allows.' }
};

/** Name of the cookie that makes an hour one visit. */
const VISIT = 'severalty-visit';

/** For a page that a link opens: what it shows, or the right refusal; counts the visit. */
export function askLink(event: Event, action: LinkAction): Opened {
  const asked = ask(event, action);
  if (asked.ok) return asked;
  const { status, message } = WORDS[asked.reason];
  error(status, { message, code: asked.reason === 'unknown' ? 'not-found' : asked.reason });
}

/** askLink for JSON routes: what the link shows, or problem details to answer with. */
export function askLinkJson(event: Event, action: LinkAction): Opened | { ok: false; response: Response } {
  const asked = ask(event, action);
  if (asked.ok) return asked;
  const { status, message } = WORDS[asked.reason];
  const code = asked.reason === 'unknown' ? 'not-found' : asked.reason;
  return { ok: false, response: problem({ status, code, title: message }) };
}

function ask(event: Event, action: LinkAction): Opened | { ok: false; reason: Refusal } {
  const token = event.params.token ?? '';
  const opened = openLink(event.locals.db, token, event.locals.person, Date.now(), event.cookies.get(VISIT));
  if (!opened.ok) return opened;
  // One path a link, so that visits of two links in one browser do not take each other's place.
  event.cookies.set(VISIT, opened.visit, {
    path: `/link/${token}`,
    httpOnly: true,
    sameSite: 'lax',
    secure: event.url.protocol === 'https:',
    maxAge: 3600
  });
  const { reportId, allowsRemarks } = opened.link;
  if (!can({ kind: 'referee', reportId, allowsRemarks }, action, { reportId }))
    return { ok: false, reason: 'not-allowed' };
  return opened;
}
