import type { GateRuleEntry } from '../../../model/team/devices/gate';
import type { Database } from '../../db/client';
import type { Actor } from '../access/actor';
import { findDevice } from '../devices/find-device';
import { ruleOf } from './rule-of';

/** The rule of a device's gate; null where there is none, or no such device for the actor. */
export const readRule = (db: Database, actor: Actor, deviceId: string): GateRuleEntry | null =>
  findDevice(db, actor, deviceId, 'see') ? ruleOf(db, deviceId) : null;
