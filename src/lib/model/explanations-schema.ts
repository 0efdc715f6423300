import { z } from 'zod';

/** The part of the document that says what else it could be; see `Explanations` in lib/stats. */
const number = z.number();
const orNull = number.nullable();
const whole = z.int().nonnegative();
const share = number.min(0).max(1);

const storyId = z.enum([
  'common-cause',
  'neighbours',
  'two-settings',
  'bursts',
  'dead-shots',
  'pair-loss',
  'misread-sites'
]);
const explanationId = z.enum([...storyId.options, 'equal-trials', 'best-independent']);

const explanation = z.strictObject({
  id: explanationId,
  logLikelihood: number,
  parameters: whole,
  aic: number,
  behind: number,
  weight: share,
  base: orNull,
  parameter: z
    .strictObject({
      symbol: z.string(),
      value: number,
      low: number,
      high: number,
      atBound: z.enum(['low', 'high', 'both']).nullable()
    })
    .nullable(),
  second: z.strictObject({ symbol: z.string(), value: number }).nullable(),
  gSquared: number,
  goodness: z.strictObject({ p: share, smallestP: share, resamples: whole }).nullable(),
  meaning: z.string()
});

export const explanationsSchema = z.strictObject({
  ranked: z.array(explanation),
  tied: z.array(explanationId),
  tieWithin: number,
  separate: z.array(
    z.strictObject({
      between: z.tuple([explanationId, explanationId]),
      measurement: z.string(),
      shots: orNull
    })
  ),
  shotsToLead: orNull,
  notRun: z.array(z.strictObject({ id: storyId, reason: z.string() })),
  pairs: z
    .strictObject({ covariance: number, correlation: number, correlationLow: orNull, statement: z.string() })
    .nullable(),
  statement: z.string()
});
