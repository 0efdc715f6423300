import type { GateRuleEntry } from '../../../model/team/devices/gate';
import type { Database } from '../../db/client';
import type { Actor } from '../access/actor';
import { versionsOf } from '../devices/versions-of';
import { findNamedDevice } from './find-named-device';
import { ruleOf } from './rule-of';
import { setRule, type SetRule } from './set-rule';

type Given = Pick<GateRuleEntry, 'tolerance' | 'alpha' | 'groups'> & { reference: string };
type Refused = Extract<SetRule, { ok: false }>;

/** Sets the rule of a device, both device and reference given by name or id; the rule that stands already stays as it is. */
export function setNamedRule(
  db: Database,
  actor: Actor,
  named: string,
  { reference, tolerance, alpha, groups }: Given
): { ok: true; rule: GateRuleEntry } | Refused {
  const device = findNamedDevice(db, actor, named);
  if (!device) return { ok: false, reason: 'unknown' };
  const versions = versionsOf(db, device);
  const found =
    versions.find(({ name }) => name === reference) ?? versions.find(({ id }) => id === reference);
  if (!found) return { ok: false, reason: 'no-version' };
  const wanted = { referenceId: found.id, tolerance, alpha, groups };
  const stands = ruleOf(db, device.id);
  const same =
    stands !== null &&
    JSON.stringify(wanted) ===
      JSON.stringify({
        referenceId: stands.referenceId,
        tolerance: stands.tolerance,
        alpha: stands.alpha,
        groups: stands.groups
      });
  if (!same) {
    const set = setRule(db, actor, device.id, { ...wanted, version: stands?.version ?? 0 });
    if (!set.ok) return set;
  }
  const rule = ruleOf(db, device.id);
  return rule ? { ok: true, rule } : { ok: false, reason: 'unknown' };
}
