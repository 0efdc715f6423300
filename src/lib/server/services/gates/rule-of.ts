import type { GateRuleEntry } from '../../../model/team/devices/gate';
import { eq } from 'drizzle-orm';
import type { Database } from '../../db/client';
import { gateRule } from '../../db/schema';

/** The rule of a device's gate; null where none was set. */
export function ruleOf(db: Pick<Database, 'select'>, deviceId: string): GateRuleEntry | null {
  const row = db.select().from(gateRule).where(eq(gateRule.deviceId, deviceId)).get();
  if (!row) return null;
  const { referenceId, referenceName, tolerance, alpha, version } = row;
  const groups = row.groups === null ? null : (JSON.parse(row.groups) as string[]);
  return { referenceId, referenceName, tolerance, alpha, groups, version };
}
