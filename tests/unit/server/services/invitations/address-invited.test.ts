import { addressInvited } from '$lib/server/services/invitations/address-invited';
import { INVITATION_LIFE } from '$lib/server/services/invitations/life';
import { describe, expect, it } from 'vitest';
import { invited, setting } from './setting';

describe('addressInvited', () => {
  it('gives the address that the page of an open invitation shows, and none else', async () => {
    const all = setting();
    const { guest, token } = await invited(all, 1000);
    const address = (path: string, now = 2000) => addressInvited(all.db, path, now);
    expect(address(`/invitation/${token}`)).toBe(guest.email);
    expect(address(`/invitation/${token}`, 1000 + INVITATION_LIFE + 1)).toBe('');
    for (const path of ['/teams', '/invitation/', `/invitation/${token}x`, `/link/${token}`])
      expect(address(path), path).toBe('');
  });
});
