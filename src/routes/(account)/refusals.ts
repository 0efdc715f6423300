import { sayWait } from '$lib/model/account/say-wait';
import type { RequestEvent } from '@sveltejs/kit';

/** Tells how long to wait, in words for the page and in the header for programs (RFC 9110, 10.2.3). */
export function waitFor(event: Pick<RequestEvent, 'setHeaders'>, seconds: number): string {
  event.setHeaders({ 'retry-after': String(seconds) });
  return `Too many tries. Wait ${sayWait(seconds)}, then try again.`;
}

/** Why no mail went out. */
export const MAIL_REFUSALS = {
  'no-mail-server': 'No mail can be sent from here: whoever runs this server has not set up a mail server.',
  'not-sent': 'The mail server did not take the message. Check the address, or try again in a while.'
} as const;

/** Why a mailed link does not work, and what to do. */
export const LINK_REFUSALS = {
  unknown: 'This link is not whole, or it is no longer known here. Have a new one mailed to you.',
  used: 'This link has been used, and works once. Have a new one mailed to you.',
  expired: 'This link has run out. Have a new one mailed to you.',
  disabled: 'This account is closed. Ask whoever runs this server.'
} as const;

/** Why an institution's word did not do. */
export const ISSUER_REFUSALS: Record<string, string> = {
  disabled: 'This account is closed. Ask whoever runs this server.',
  unverified:
    'Your institution does not confirm that the address it gave is yours. Sign in another way, then tie your institution to your account on the account page.',
  other: 'That identity belongs to another account here.',
  failed: 'Signing in there did not work, or was broken off. Try again.'
};
