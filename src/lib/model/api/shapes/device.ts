import { z } from 'zod';
import { MOST_GROUPS } from '../../team/devices/gate';
import { momentSchema } from './moment';

/** A device in the list. */
export const deviceEntrySchema = z.object({
  id: z.string(),
  name: z.string(),
  versions: z.int().describe('Firmware versions'),
  datasets: z.int(),
  newest: z.string().nullable().describe('Name of the last version in order')
});

export const deviceListSchema = z.object({ data: z.array(deviceEntrySchema) });

export const gateRuleSchema = z.object({
  reference: z.string().nullable().describe('Name of the reference version; null once it is removed'),
  tolerance: z.number().min(0).describe('Excess of variance over the ceiling that is allowed: 0.1 is 10 %'),
  alpha: z.number(),
  groups: z.array(z.string()).nullable().describe('Groups that count; null for all')
});

/** A rule as a script sets it. */
export const newRuleSchema = z.strictObject({
  reference: z.string().min(1).max(200).describe('Name or id of the version that others are held against'),
  tolerance: z
    .number()
    .min(0)
    .max(10)
    .default(0.1)
    .describe('Excess of variance over the ceiling that is allowed: 0.1 is 10 %'),
  alpha: z
    .number()
    .min(0.0001)
    .max(0.2)
    .default(0.05)
    .describe('How often a version without any excess or rise may fail by chance, at most'),
  groups: z
    .array(z.string().min(1).max(200))
    .min(1)
    .max(MOST_GROUPS)
    .nullable()
    .default(null)
    .describe('Groups that count, each named by a dataset of the device; null for all')
});

/** A device with its firmware versions in order and the rule of its gate. */
export const deviceSchema = z.object({
  id: z.string(),
  name: z.string(),
  notes: z.string().nullable(),
  versions: z
    .array(
      z.object({
        id: z.string(),
        name: z.string(),
        notes: z.string().nullable(),
        datasets: z.int().describe('Without those put aside')
      })
    )
    .describe('In order'),
  rule: gateRuleSchema.nullable().describe('Null where no rule is set')
});

const intervalSchema = z.object({ value: z.number(), low: z.number(), high: z.number() }).nullable();
const testSchema = z.object({
  z: z.number(),
  p: z.number(),
  pAdjusted: z.number().describe('By Holm over all tests of the gate')
});
const outcomeSchema = z.enum(['passed', 'failed', 'undecided']);

/** The gate document. */
export const gateDocumentSchema = z.object({
  format: z.literal('severalty.gate/1'),
  version: z.string(),
  rule: gateRuleSchema,
  outcome: outcomeSchema,
  tests: z.int(),
  groups: z.array(
    z.object({
      group: z.string(),
      outcome: outcomeSchema,
      dispersion: intervalSchema.describe('Variance over ceiling, with its 95 % interval'),
      referenceDispersion: intervalSchema,
      overTolerance: testSchema.nullable().describe('Is it above 1 + tolerance?'),
      overReference: testSchema
        .extend({ factor: z.number() })
        .nullable()
        .describe('Is it above that of the reference?'),
      smallestExcess: z
        .number()
        .nullable()
        .describe('Smallest excess over the ceiling that is seen to be above the tolerance with 80 % power'),
      smallestRise: z.number().nullable().describe('The same for a rise over the reference'),
      hindrances: z.array(z.string()),
      reasons: z.array(z.string())
    })
  ),
  statement: z.string(),
  because: z.array(z.string()),
  cautions: z.array(z.string())
});

/** A gate as it stands now. */
export const gateSchema = z.object({
  outcome: outcomeSchema,
  statement: z.string(),
  device: z.object({ id: z.string(), name: z.string() }),
  version: z.object({ id: z.string(), name: z.string() }),
  waiting: z
    .array(z.object({ id: z.string(), name: z.string() }))
    .describe(
      'Datasets whose diagnosis waits or runs: ask again when none is left. One for whose diagnosis nobody asked is not among them: the reasons of its group say so'
    ),
  decidedAt: momentSchema,
  document: gateDocumentSchema
});
