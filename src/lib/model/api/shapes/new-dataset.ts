import { z } from 'zod';
import { CONDITION_NAMES, conditionsSchema } from '../../team/datasets/conditions';
import { typedNumber } from '../../team/datasets/typed-number';

/** Conditions that a script may state; what it leaves out is as the file says, or not stated. */
const stated = conditionsSchema.partial();

/**
 * A dataset as JSON. The counts are read from the body by the reader of JSON files, which names lines; here they are
 * held to their outer shape only.
 */
export const newDatasetSchema = z.strictObject({
  name: stated.shape.name.describe('What the team calls it'),
  counts: z
    .union([z.record(z.string(), z.number()), z.array(z.tuple([z.union([z.int(), z.string()]), z.number()]))])
    .optional()
    .describe(
      'A histogram: {"0": 12, "1": 30} or [[0, 12], [1, 30]], numbers of shots; a first "0-2" and a last "10+" are lumps'
    ),
  lump: z
    .object({ from: z.int(), shots: z.int() })
    .nullable()
    .optional()
    .describe('Shots with this count or more'),
  below: z
    .object({ to: z.int(), shots: z.int() })
    .nullable()
    .optional()
    .describe('Shots with this count or fewer'),
  shots: z.array(z.int()).optional().describe('Or a shot list: one count a shot, in their order'),
  batches: z
    .array(z.union([z.string(), z.number()]))
    .optional()
    .describe('Name of the batch of each shot'),
  conditions: stated.omit({ name: true }).optional().describe('Conditions it was taken under')
});
export type NewDataset = z.output<typeof newDatasetSchema>;

const { shape } = stated;
/** A number in an address; what is none is told as none, and an empty one is not stated. */
const number = <Inner extends z.ZodType>(inner: Inner) =>
  z.preprocess(
    (given) =>
      typeof given !== 'string' ? given : given.trim() === '' ? null : (typedNumber(given) ?? given),
    inner
  );

/** The conditions of a dataset that comes as a plain file, in the query of its address; and how to read the file. */
export const newDatasetQuery = z.strictObject({
  ...shape,
  quenchTime: number(shape.quenchTime),
  holdTime: number(shape.holdTime),
  trials: number(shape.trials),
  misread: number(shape.misread),
  misreadUncertainty: number(shape.misreadUncertainty),
  format: z
    .enum(['auto', 'counts', 'shots', 'positions'])
    .optional()
    .describe('How to read the file, where it could be read two ways')
});

export type StatedConditions = z.output<typeof stated>;

/** The conditions among what was stated, without what was left out. */
export function statedConditions(given: Record<string, unknown>): StatedConditions {
  const said = CONDITION_NAMES.filter((name) => given[name] !== undefined);
  return Object.fromEntries(said.map((name) => [name, given[name]]));
}
