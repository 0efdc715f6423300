import { can } from '$lib/server/access/can';
import { storageTrouble } from '$lib/server/services/datasets/storage-trouble';
import {
  openLink,
  type LinkRefusal,
  type OpenLink,
  type ShownThing
} from '$lib/server/services/links/open-link';
import { spendFile } from '$lib/server/services/links/spend-file';
import { error, redirect, type RequestEvent } from '@sveltejs/kit';
import { problem } from './problem';

type Event = Pick<RequestEvent, 'locals' | 'cookies' | 'url' | 'request'> & {
  params: Partial<Record<string, string>>;
};
type Kind = ShownThing['opens'];
type OpenedAs<Of extends Kind> = Extract<OpenLink<Of>, { ok: true }>;
type Refusal = LinkRefusal | 'not-allowed' | 'busy' | 'full';

/** What a link may be asked for. */
export type LinkAction = 'see' | 'remark';

const WORDS: Record<Refusal, { status: number; message: string }> = {
  unknown: { status: 404, message: 'There is no page at this address.' },
  'other-kind': { status: 404, message: 'There is no page at this address.' },
  'sign-in': { status: 401, message: 'This link opens for people who sign in.' },
  'not-named': { status: 403, message: 'This link was made for somebody at another address.' },
  'not-in-team': { status: 403, message: 'This link opens for members of the team alone.' },
  'not-allowed': { status: 403, message: 'This link does not allow that.' },
  expired: { status: 410, message: 'This link has expired.' },
  revoked: { status: 410, message: 'This link was closed.' },
  busy: {
    status: 503,
    message: 'The database is busy, so the link cannot be opened now. Try again in a moment.'
  },
  full: {
    status: 507,
    message: 'The disk of the server is full, so the link cannot be opened. Tell who runs it.'
  },
  'used-up': { status: 410, message: 'This link was opened as often as it allows.' }
};

/** Name of the cookie that makes an hour one visit. */
const VISIT = 'severalty-visit';

/** For the page of a report that a link opens: what it shows, or the right refusal; counts the visit. */
export function askLink(event: Event, action: LinkAction): OpenedAs<'report'> {
  const asked = ask(event, action, 'report');
  // The page of a sweep stands beside that of a report; whoever is sent there was not counted here.
  if (!asked.ok && asked.reason === 'other-kind' && action === 'see')
    redirect(303, `/link/${event.params.token}/sweep`);
  return orError(asked);
}

/** askLink for the page of a sweep. */
export const askLinkSweep = (event: Event): OpenedAs<'sweep'> => orError(ask(event, 'see', 'sweep'));

/** askLink for JSON routes: what the link shows, or problem details to answer with. */
export const askLinkJson = (event: Event, action: LinkAction) => orProblem(ask(event, action, 'report'));

/** askLinkSweep for JSON routes. */
export const askLinkSweepJson = (event: Event) => orProblem(ask(event, 'see', 'sweep'));

/** askLinkJson for a PDF or a zip, which take the server half a second each: so many a minute, then 429. */
export const askLinkFile = (event: Event) => spent(event, () => askLinkJson(event, 'see'));

/** askLinkFile for a sweep. */
export const askLinkSweepFile = (event: Event) => spent(event, () => askLinkSweepJson(event));

const codeOf = (reason: Refusal): string =>
  reason === 'unknown' || reason === 'other-kind' ? 'not-found' : reason;

type Refused = { ok: false; reason: Refusal };

function orError<Of extends Kind>(asked: OpenedAs<Of> | Refused): OpenedAs<Of> {
  if (asked.ok) return asked;
  const { status, message } = WORDS[asked.reason];
  error(status, { message, code: codeOf(asked.reason) });
}

function orProblem<Of extends Kind>(
  asked: OpenedAs<Of> | Refused
): OpenedAs<Of> | { ok: false; response: Response } {
  if (asked.ok) return asked;
  const { status, message } = WORDS[asked.reason];
  const code = codeOf(asked.reason);
  return { ok: false, response: problem({ status, code, title: message }) };
}

async function spent<Asked>(
  event: Event,
  then: () => Asked
): Promise<Asked | { ok: false; response: Response }> {
  const spent = await spendFile(event.params.token ?? '');
  if (spent.ok) return then();
  const title = `Too many files were made through this link. Wait ${spent.seconds} s and ask again.`;
  const response = problem({ status: 429, code: 'too-many-requests', title });
  response.headers.set('retry-after', String(spent.seconds));
  return { ok: false, response };
}

function ask<Of extends Kind>(event: Event, action: LinkAction, wanted: Of): OpenedAs<Of> | Refused {
  const token = event.params.token ?? '';
  const opened = open(event, token, wanted);
  if (!opened.ok) return opened;
  // One path a link, so that visits of two links in one browser do not take each other's place.
  if (opened.visit !== null)
    event.cookies.set(VISIT, opened.visit, {
      path: `/link/${token}`,
      httpOnly: true,
      sameSite: 'lax',
      secure: event.url.protocol === 'https:',
      maxAge: 3600
    });
  const { allowsRemarks, thingId: id } = opened.link;
  if (!can({ kind: 'referee', opens: id, allowsRemarks }, action, { id }))
    return { ok: false, reason: 'not-allowed' };
  return opened;
}

/** Opens the link. A visit that cannot be counted is not let in: the limit of visits would not hold. */
function open<Of extends Kind>(
  { locals, cookies, request }: Event,
  token: string,
  wanted: Of
): OpenLink<Of> | { ok: false; reason: 'busy' | 'full' } {
  // A HEAD is shown nothing; mail programs send them to look whether a link is alive.
  const counts = request.method !== 'HEAD';
  try {
    return openLink(locals.db, token, locals.person, Date.now(), cookies.get(VISIT), counts, wanted);
  } catch (error) {
    const trouble = storageTrouble(error);
    if (!trouble) throw error;
    return { ok: false, reason: trouble };
  }
}
