import { can, type Standing } from '$lib/server/access/can';
import type { Action } from '$lib/server/access/actions';
import type { Role } from '$lib/model/team/roles';
import { describe, expect, it } from 'vitest';

/** The table of roles, written out a second time: action, then lead, experimenter, observer; "own" where it must be theirs. */
const table: [Action, string, string, string][] = [
  ['see', 'yes', 'yes', 'yes'],
  ['upload', 'yes', 'yes', 'no'],
  ['edit', 'yes', 'yes', 'no'],
  ['diagnose', 'yes', 'yes', 'no'],
  ['delete', 'yes', 'own', 'no'],
  ['restore', 'yes', 'own', 'no'],
  ['link', 'yes', 'own', 'no'],
  ['remark', 'yes', 'yes', 'yes'],
  ['script', 'yes', 'own', 'own'],
  ['manage', 'yes', 'no', 'no']
];

const roles: Role[] = ['lead', 'experimenter', 'observer'];

describe('can', () => {
  it.each(table)('%s: lead %s, experimenter %s, observer %s', (action, ...grants) => {
    roles.forEach((role, i) => {
      const standing: Standing = { kind: 'member', personId: 'me', role };
      expect(can(standing, action, { createdBy: 'me' }), `${role}, own`).toBe(grants[i] !== 'no');
      expect(can(standing, action, { createdBy: 'another' }), `${role}, another's`).toBe(grants[i] === 'yes');
      expect(can(standing, action, { createdBy: null }), `${role}, nobody's`).toBe(grants[i] === 'yes');
      expect(can(standing, action), `${role}, nothing named`).toBe(grants[i] === 'yes');
    });
  });

  it.each(table)(
    '%s by link: the linked report may be seen, and remarked on where the link allows it',
    (action) => {
      for (const allowsRemarks of [true, false]) {
        const standing: Standing = { kind: 'referee', opens: 'r', allowsRemarks };
        expect(can(standing, action, { id: 'r' })).toBe(
          action === 'see' || (action === 'remark' && allowsRemarks)
        );
        expect(can(standing, action, { id: 'other' })).toBe(false);
        expect(can(standing, action)).toBe(false);
      }
    }
  );
});
