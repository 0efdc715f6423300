import type { Database } from '../../db/client';
import type { Actor } from '../access/actor';
import { setNamedRule } from '../gates/set-named-rule';

/** A rule for the gate of the invented device with four firmware versions, of which ebb 3.3 lets neighbours talk. */
export function seedDemoGate(db: Database, actor: Actor): void {
  const set = setNamedRule(db, actor, 'Marram', {
    reference: 'ebb 3.1',
    tolerance: 0.1,
    alpha: 0.05,
    groups: null
  });
  if (!set.ok) throw new Error(`The rule of the demo team's gate could not be set: ${set.reason}.`);
}
