import { z } from 'zod';
import { frozenConditionsSchema } from '../../team/frozen-conditions';
import { momentSchema } from './moment';
import { verdictSchema } from './verdict';

const brief = {
  id: z.string(),
  number: z.int().describe('Counts up within its dataset'),
  dataset: z.object({ id: z.string(), name: z.string().describe('Its name now') }),
  verdict: verdictSchema,
  engineVersion: z.string(),
  by: z.string().nullable().describe('Name of who asked for it; null when they are gone'),
  createdAt: momentSchema
};

/** A report in a list. */
export const reportEntrySchema = z.object(brief);
export type ApiReportEntry = z.infer<typeof reportEntrySchema>;

const orNull = z.number().nullable();

/** A report; its numbers are in its files. */
export const reportSchema = z.object({
  ...brief,
  statement: z.string().nullable().describe('The answer in one sentence; null when the document is damaged'),
  sha256: z.string().describe('Of document.json, byte for byte'),
  conditions: frozenConditionsSchema.describe(
    'Conditions when it was made; those of the dataset may have changed'
  ),
  options: z.object({
    trials: orNull,
    unit: z.enum(['defect', 'pair']),
    geometry: z.enum(['sites', 'open-bonds', 'ring-bonds']),
    misread: orNull,
    misreadUncertainty: orNull.describe(
      'Standard uncertainty of the misread rate; null where it was taken as exact'
    ),
    kept: z
      .object({ from: z.int(), to: z.int().nullable() })
      .nullable()
      .describe('Counts kept; null where no shot was dropped by its count'),
    alpha: z.number(),
    tolerance: z.number(),
    resamples: z.int(),
    seed: z.int()
  }),
  files: z
    .object({
      document: z.string(),
      numbers: z.string(),
      distribution: z.string(),
      tails: z.string(),
      pdf: z.string(),
      bundle: z.string()
    })
    .describe('Addresses, from the root of the server')
});
export type ApiReport = z.infer<typeof reportSchema>;
