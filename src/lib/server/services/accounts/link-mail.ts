import { MINUTES, type Purpose } from './mailed-purposes';

type Letter = { subject: string; text: string };

/** The letter that carries a link. It greets nobody by name: whoever asked may not be who reads it. */
export function linkMail(purpose: Purpose, link: string, origin: string): Letter {
  const [subject, wish, press] =
    purpose === 'sign-in'
      ? ['Sign in to Severalty', 'sign in to Severalty', 'press its button']
      : ['Choose a new password for Severalty', 'choose a new password for Severalty', 'type the new one'];
  return {
    subject,
    text: `Somebody, most likely you, asked to ${wish}
at ${origin} with this address.

Open this page and ${press}:

${link}

It works once, within ${MINUTES[purpose]} minutes. If you did not ask for it, do nothing:
without this mail nobody gets in.
`
  };
}

/** To somebody without an account who asked for a new password. */
export function nobodyMail(origin: string): Letter {
  return {
    subject: 'Your address is not known to Severalty',
    text: `Somebody, most likely you, asked for a new password for Severalty
at ${origin} with this address.

No account has it. Perhaps yours has another address. You can also have a
link mailed to you that signs you in without a password:

${origin}/sign-in/by-mail

If you did not ask for it, do nothing.
`
  };
}
