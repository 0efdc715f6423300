import type { z } from 'zod';
import type { GateRuleEntry } from '../team/devices/gate';
import type { gateRuleSchema } from './shapes/device';

/** The rule of a gate as the API tells it. */
export const toRule = ({
  referenceId,
  referenceName,
  tolerance,
  alpha,
  groups
}: GateRuleEntry): z.output<typeof gateRuleSchema> => ({
  reference: referenceId === null ? null : referenceName,
  tolerance,
  alpha,
  groups
});
