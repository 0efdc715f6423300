import { z } from 'zod';

const words = z.string().nullable();
const number = z.number().nullable();

/**
 * The conditions of a dataset as they stood when a report was made. They are kept with the report, since those of the
 * dataset may change later. A key that an older report lacks reads as not stated.
 */
export const frozenConditionsSchema = z.object({
  name: z.string(),
  device: words.default(null),
  firmware: words.default(null),
  group: words.default(null),
  quenchTime: number.default(null),
  quenchUnit: words.default(null),
  holdTime: number.default(null),
  holdUnit: words.default(null),
  geometry: z.enum(['sites', 'open-bonds', 'ring-bonds']),
  unit: z.enum(['defect', 'pair']),
  trials: z.int().nullable().default(null),
  trialsWhy: words.default(null),
  misread: number.default(null),
  misreadUncertainty: number.default(null),
  kept: words.default(null),
  postSelection: words.default(null),
  measuredOn: words.default(null),
  notes: words.default(null)
});

export type FrozenConditions = z.infer<typeof frozenConditionsSchema>;
