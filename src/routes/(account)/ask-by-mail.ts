import { emailForm } from '$lib/model/account/sign-in';
import { clientOf } from '$lib/server/auth/client-of';
import { ownPath } from '$lib/server/auth/own-path';
import { mailLink } from '$lib/server/services/accounts/mail-link';
import type { Purpose } from '$lib/server/services/accounts/mailed-purposes';
import { addressInvited } from '$lib/server/services/invitations/address-invited';
import { outboxIsOpen } from '$lib/server/services/accounts/outbox';
import { waysIn } from '$lib/server/services/accounts/ways-in';
import type { RequestEvent } from '@sveltejs/kit';
import { fail, message, setError, superValidate } from 'sveltekit-superforms';
import { zod4 } from 'sveltekit-superforms/adapters';
import { MAIL_REFUSALS, waitFor } from './refusals';

/** For the two pages that mail a link: one form, an address. */
export async function showAskByMail(event: RequestEvent) {
  const then = ownPath(event.url.searchParams.get('then'));
  const email = event.locals.person?.email ?? addressInvited(event.locals.db, then);
  const form = await superValidate({ email }, zod4(emailForm), { errors: false });
  return {
    form,
    then,
    mail: waysIn().mail,
    outbox: outboxIsOpen(clientOf(event))
  };
}

/** Mails the link. The answer is the same whether or not anybody has the address. */
export async function askByMail(event: RequestEvent, purpose: Purpose) {
  const form = await superValidate(await event.request.formData(), zod4(emailForm));
  if (!form.valid) return fail(400, { form });
  const { email } = form.data;
  const then = ownPath(event.url.searchParams.get('then'));
  const mailed = await mailLink(
    event.locals.db,
    { purpose, email, then },
    { client: clientOf(event), origin: event.url.origin }
  );
  if (mailed.ok) return message(form, `A message is on its way to ${email}.`);
  if (mailed.reason === 'wait') return setError(form, '', waitFor(event, mailed.seconds), { status: 429 });
  return setError(form, '', MAIL_REFUSALS[mailed.reason], { status: 503 });
}
