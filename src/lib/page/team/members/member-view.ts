import type { Role } from '$lib/model/team/roles';

/** A member as the list shows one. */
export interface MemberView {
  personId: string;
  name: string;
  email: string;
  role: Role;
  since: number;
  disabled: boolean;
}

/** An invitation as the list shows one. */
export interface InvitationView {
  id: string;
  email: string;
  role: Role;
  by: string | null;
  createdAt: number;
  expiresAt: number;
  expired: boolean;
}
