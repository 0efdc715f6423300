import { z } from 'zod';
import { testSchema } from './test-schema';

/* What can look like interaction, in a diagnosis document; diagnosis-schema.ts holds it to the type. */
const number = z.number();
const orNull = number.nullable();
const whole = z.int().nonnegative();
const share = number.min(0).max(1);
const interval = z.strictObject({ value: orNull, low: orNull, high: orNull });
const level = z.strictObject({ p: share, trials: whole });

const verdict = z.enum(['compatible', 'ruled-out', 'undecided']);

const spread = z.strictObject({
  uncertainty: number,
  miss: share,
  low: share,
  high: share,
  cutByCounts: z.boolean(),
  rates: z.array(z.strictObject({ rate: share, ceiling: number, dispersion: interval, verdict })),
  changes: z.array(z.strictObject({ above: share, below: share, from: verdict, to: verdict })),
  statement: z.string()
});

const misread = z.strictObject({
  applied: z.boolean(),
  rate: orNull,
  ceiling: orNull,
  rawCeiling: number,
  rawDispersion: orNull,
  neededRate: interval,
  largestRate: share.optional(),
  spread: spread.optional(),
  kinks: z.array(level).nullable()
});

const batchLine = z.strictObject({
  batch: whole,
  shots: whole,
  mean: number,
  dispersion: orNull,
  p: share.nullable()
});

const split = z.strictObject({
  batches: whole,
  dispersion: interval,
  excessWithin: interval,
  excessBetween: number,
  excess: number,
  meansVariance: interval,
  p: share.nullable(),
  smallestP: share,
  source: z.enum(['resampled', 'limit']),
  resamples: whole,
  tested: whole,
  worst: batchLine.nullable(),
  pTogether: share.nullable(),
  order: z
    .strictObject({ correlation: number, p: share, dispersion: interval, moved: z.boolean() })
    .nullable()
    .optional(),
  verdict: z.enum(['compatible', 'excess', 'undecided']),
  each: z.array(batchLine)
});

const drift = z.strictObject({
  means: z.array(
    z.strictObject({ from: whole, to: whole, mean: number, low: number, high: number, outside: z.boolean() })
  ),
  change: z
    .strictObject({
      shot: whole,
      before: number,
      after: number,
      p: share,
      smallestP: share,
      source: z.enum(['permuted', 'limit']),
      resamples: whole
    })
    .nullable(),
  split: split.nullable(),
  statement: z.string()
});

const pairs = z.strictObject({
  proposed: z.boolean(),
  logChance: orNull,
  odd: z
    .strictObject({ shots: whole, share: interval, faultyShots: interval, faultyBonds: interval })
    .nullable(),
  statement: z.string()
});

const emptyAside = z.strictObject({
  shots: whole,
  mean: number,
  ceiling: number,
  dispersion: interval,
  p: share,
  smallestP: share,
  resamples: whole,
  tests: z.array(testSchema),
  verdict: z.enum(['compatible', 'excess', 'misfit', 'undecided']),
  statement: z.string()
});

const trials = z.strictObject({
  points: z.array(
    z.strictObject({
      trials: whole.nullable(),
      ceiling: number,
      dispersion: interval,
      standing: z.enum(['over', 'within', 'unsure'])
    })
  ),
  critical: orNull,
  statement: z.string()
});

/** Each part is there only where it has something to say. */
export const nuisancesSchema = z.strictObject({
  misread: misread.optional(),
  drift: drift.optional(),
  pairs: pairs.optional(),
  emptyAside: emptyAside.optional(),
  trials: trials.optional(),
  lumped: z
    .strictObject({
      mean: z.strictObject({ low: number, high: orNull }),
      variance: z.strictObject({ low: orNull, high: orNull })
    })
    .optional()
});
