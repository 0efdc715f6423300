import { z } from 'zod';
import type { Diagnosis } from '$lib/stats/types';
import { explanationsSchema } from './explanations-schema';
import { nuisancesSchema } from './nuisances-schema';
import { testIdSchema, testSchema } from './test-schema';

/*
 * The diagnosis document as a schema, for documents that come from outside: a stored file, an
 * answer of the API, an upload. Unknown keys are refused, since the document may grow only together
 * with this file; the last lines make the compiler hold the schema to the type.
 */
const number = z.number();
const orNull = number.nullable();
const whole = z.int().nonnegative();
const share = number.min(0).max(1);
const interval = z.strictObject({ value: orNull, low: orNull, high: orNull });
const level = z.strictObject({ p: share, trials: whole });
const lump = z.strictObject({ from: whole, shots: whole });
const side = z.enum(['high', 'low']);
const flagId = z.enum([
  'bunching',
  'bursts',
  'coarsening',
  'pairing',
  'dead-shots',
  'drift',
  'misreads',
  'regular'
]);
const referenceId = z.enum(['equal-trials', 'rare-events', 'gaussian', 'landau-zener', 'supplied']);

const data = z.strictObject({
  digest: z.string().regex(/^sha256:[0-9a-f]{64}$/),
  shots: whole,
  trials: whole.nullable(),
  unit: z.enum(['defect', 'pair']),
  geometry: z.enum(['sites', 'open-bonds', 'ring-bonds']),
  misread: orNull,
  misreadUncertainty: number.optional(),
  counts: z.array(z.tuple([whole, whole])),
  lump: lump.nullable(),
  below: z.strictObject({ to: whole, shots: whole }).optional(),
  kept: z.strictObject({ from: whole, to: whole.nullable() }).optional(),
  ordered: z.boolean(),
  batches: whole.nullable()
});

const moments = z.strictObject({
  mean: interval,
  variance: interval,
  third: interval,
  fourth: interval,
  fano: interval,
  ceiling: number,
  dispersion: interval,
  criticalTrials: orNull,
  pairCovariance: orNull
});

const reference = z.strictObject({
  id: referenceId,
  logLikelihood: number,
  divergence: orNull,
  aic: number,
  parameters: z.record(z.string(), number)
});

const fit = z.strictObject({
  logLikelihood: number,
  levels: z.array(level),
  poissonPart: number,
  divergence: number,
  floor: number,
  divergenceCorrected: orNull,
  divergenceInterval: interval,
  gSquared: number,
  shotsToNotice: orNull,
  certified: z.boolean(),
  how: z.string(),
  references: z.array(reference),
  omitted: z.array(z.strictObject({ id: referenceId, reason: z.string() }))
});

const distributionPoint = z.strictObject({
  count: whole,
  density: orNull,
  shots: whole,
  observed: share,
  low: share,
  high: share,
  fitted: number,
  lump: z.boolean(),
  below: z.literal(true).optional()
});

const ratePoint = z.strictObject({
  count: whole,
  density: orNull,
  empirical: orNull,
  low: number,
  high: orNull,
  fitted: orNull,
  limit: orNull,
  gaussian: orNull
});

const tailPoint = z.strictObject({
  count: whole,
  side,
  shots: whole,
  observed: share,
  low: share,
  high: share,
  fitted: number,
  chernoff: number,
  meanChernoff: number,
  hoeffding: number
});

const certificate = z.strictObject({
  p: share,
  side,
  count: whole,
  thresholds: whole,
  bound: share,
  shots: whole,
  mean: number
});

const flag = z.strictObject({
  id: flagId,
  grade: z.enum(['shown', 'hinted']),
  tests: z.array(testIdSchema),
  statement: z.string(),
  size: z.string(),
  otherCauses: z.array(z.string()),
  next: z.array(z.string())
});

/** Checks a diagnosis document; numbers must be finite. */
export const diagnosisSchema = z.strictObject({
  format: z.literal('severalty.diagnosis/1'),
  engine: z.strictObject({
    version: z.string(),
    seed: whole,
    resamples: whole,
    alpha: number,
    tolerance: number
  }),
  data,
  moments,
  nuisances: nuisancesSchema.optional(),
  fit,
  distribution: z.array(distributionPoint),
  rate: z.strictObject({ horizon: number, silence: number, scale: number, points: z.array(ratePoint) }),
  tails: z.strictObject({ points: z.array(tailPoint), certificate: certificate.nullable() }),
  tests: z.array(testSchema),
  notRun: z.array(z.strictObject({ id: testIdSchema, reason: z.string() })),
  flags: z.array(flag),
  answer: z.strictObject({
    verdict: z.enum(['compatible', 'ruled-out', 'undecided']),
    statement: z.string(),
    because: z.array(z.string()),
    smallestExcess: orNull,
    shotsToDecide: orNull
  }),
  cautions: z.array(z.string()),
  explanations: explanationsSchema.optional()
});

type Same<A, B> = (<T>() => T extends A ? 1 : 2) extends <T>() => T extends B ? 1 : 2 ? true : false;
/** Each field must have the same type in the schema and in `Diagnosis`; a name here is a mismatch. */
type Mismatch = {
  [Key in keyof Diagnosis | keyof z.infer<typeof diagnosisSchema>]-?: Same<
    z.infer<typeof diagnosisSchema>[Key],
    Diagnosis[Key]
  > extends true
    ? never
    : Key;
}[keyof Diagnosis];
const agrees: [Mismatch] extends [never] ? true : Mismatch = true;
void agrees;
