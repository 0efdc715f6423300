import type { Invite } from '$lib/server/services/invitations/invite';
import type { Mailed } from '$lib/server/services/invitations/mail-invitation';

export const LAST_LEAD = 'A team keeps a lead. Make somebody else a lead first.';
export const NOT_HERE = 'It is not here any more: somebody else changed this list meanwhile.';

export const INVITE_REFUSALS: Record<Extract<Invite, { ok: false }>['reason'], string> = {
  'not-allowed': 'You are no lead of this team any more.',
  member: 'They are in the team already; their role can be changed above.',
  invited: 'There is an open invitation to this address. It can be sent again below.',
  'too-many': 'This team has 200 open invitations. Revoke some that are not needed.'
};

/** What to say after a mail; with the address of the invitation when it did not go. */
export function afterMail(email: string, mailed: Mailed): { told: string; address?: string } {
  if (mailed.mailed) return { told: `Mailed to ${email}. The invitation is good for 14 days.` };
  return {
    told: `The invitation is made, but no mail went to ${email}. Give them this address yourself; it is shown only now.`,
    address: mailed.address
  };
}
