import { ROLE_WORDS } from '../members/role-words';
import type { Role } from '../roles';

export type EventDetail = Record<string, string | number | boolean | null>;

/** How an action is told. */
export interface Words {
  /** What the action is called in the list of filters. */
  label: string;
  say: (event: { who: string; thing: string; detail: EventDetail }) => string;
}

export const role = (value: unknown) => ROLE_WORDS[value as Role]?.article ?? String(value);
export const many = (n: unknown, one: string) => `${String(n)} ${one}${n === 1 ? '' : 's'}`;

/** A script acts for who made its token: both are told. */
export const byScript = (detail: EventDetail) => (detail.script ? ` by the script “${detail.script}”` : '');
