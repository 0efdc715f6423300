import { sayGroup } from '../../../model/team/devices/cell';
import type { GateRuleForm } from '../../../model/team/devices/gate';
import { and, eq } from 'drizzle-orm';
import type { Database } from '../../db/client';
import { firmwareVersion, gateRule } from '../../db/schema';
import type { Actor } from '../access/actor';
import { scriptOf } from '../access/script-of';
import { cellsOf } from '../devices/cells-of';
import { findDevice } from '../devices/find-device';
import { recordEvent } from '../events/record-event';
import { ruleOf } from './rule-of';

export type SetRule =
  | { ok: true; version: number }
  /** `no-version`: the reference is none of this device's. `stale`: somebody set another rule meanwhile. */
  | { ok: false; reason: 'unknown' | 'no-version' | 'stale' }
  /** Groups that no dataset of the device names, or only such as are put aside. */
  | { ok: false; reason: 'no-group'; groups: string[] };

/** Sets the rule of a device's gate, if it still is as the editor saw it. */
export function setRule(
  db: Database,
  actor: Actor,
  deviceId: string,
  rule: GateRuleForm,
  now = Date.now()
): SetRule {
  return db.transaction(
    (tx): SetRule => {
      const found = findDevice(tx, actor, deviceId, 'edit');
      if (!found) return { ok: false, reason: 'unknown' };
      const { referenceId, tolerance, alpha } = rule;
      const reference = tx
        .select({ name: firmwareVersion.name })
        .from(firmwareVersion)
        .where(and(eq(firmwareVersion.id, referenceId), eq(firmwareVersion.deviceId, deviceId)))
        .get();
      if (!reference) return { ok: false, reason: 'no-version' };
      const before = ruleOf(tx, deviceId)?.version ?? 0;
      if (before !== rule.version) return { ok: false, reason: 'stale' };
      const there = new Set(cellsOf(tx, found).map(({ group }) => sayGroup(group)));
      const missing = (rule.groups ?? []).filter((group) => !there.has(group));
      if (missing.length > 0) return { ok: false, reason: 'no-group', groups: missing };
      const version = before + 1;
      const groups = rule.groups === null ? null : JSON.stringify(rule.groups);
      const set = { referenceId, referenceName: reference.name, tolerance, alpha, groups, version };
      const by = { updatedBy: actor.personId, updatedAt: now };
      tx.insert(gateRule)
        .values({ deviceId, ...set, ...by })
        .onConflictDoUpdate({ target: gateRule.deviceId, set: { ...set, ...by } })
        .run();
      const detail = { name: found.name, reference: reference.name, tolerance, alpha, ...scriptOf(actor) };
      const happening = { teamId: actor.teamId, personId: actor.personId, thing: deviceId };
      recordEvent(tx, { ...happening, action: 'gate.rule', detail }, now);
      return { ok: true, version };
    },
    { behavior: 'immediate' }
  );
}
