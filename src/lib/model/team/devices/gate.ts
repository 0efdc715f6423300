import { z } from 'zod';

/** The rule of a device's gate, as pages show it. */
export interface GateRuleEntry {
  /** Null once that version is removed. */
  referenceId: string | null;
  referenceName: string;
  /** Excess of variance over the ceiling that is allowed, as a fraction. */
  tolerance: number;
  alpha: number;
  /** Null for every group of the reference or the version. */
  groups: string[] | null;
  /** Grows with every change; 0 where there is no rule yet. */
  version: number;
}

/** Groups that a rule may name, each on a line of its own. */
export const MOST_GROUPS = 500;

/** Why a rule is refused that names groups without a dataset. */
export const sayNoGroups = (groups: string[]): string =>
  `No dataset of this device names ${groups.length === 1 ? 'the group' : 'the groups'} ${groups.slice(0, 8).join(', ')}${groups.length > 8 ? ` and ${groups.length - 8} more` : ''}: every gate would be undecided for want of it. The rule stands as it was.`;

/** What a person says about the rule; percentages as they are typed. */
export const gateRuleSchema = z.object({
  version: z.coerce.number().int().min(0),
  referenceId: z.string('Choose a version.').min(1, 'Choose a version.').max(64),
  tolerance: z.coerce
    .number('Write a number of per cent.')
    .min(0, 'The tolerance is 0 % or more.')
    .max(1000, 'A tolerance of more than 1000 % would let everything pass.')
    .transform((percent) => percent / 100),
  alpha: z.coerce
    .number('Write a number of per cent.')
    .min(0.01, 'The level is at least 0.01 %.')
    .max(20, 'The level is at most 20 %.')
    .transform((percent) => percent / 100),
  groups: z
    .string()
    .max(50_000)
    .transform((text) => [
      ...new Set(
        text
          .split(/\r?\n/)
          .map((line) => line.trim())
          .filter(Boolean)
      )
    ])
    .refine((groups) => groups.length <= MOST_GROUPS, `Name at most ${MOST_GROUPS} groups.`)
    .transform((groups) => (groups.length === 0 ? null : groups))
});
export type GateRuleForm = z.output<typeof gateRuleSchema>;

/** Datasets of the version or its reference whose diagnosis waits or runs. */
export interface WaitingDataset {
  id: string;
  name: string;
}
