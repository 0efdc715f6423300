import type { SweepReport } from '$lib/stats/sweep/types';
import { z } from 'zod';
import { verdictSchema } from './verdict';

const interval = z.object({ value: z.number(), low: z.number(), high: z.number() });
const openInterval = z.object({
  value: z.number().nullable(),
  low: z.number().nullable(),
  high: z.number().nullable()
});
const chance = z.number().min(0).max(1);
const span = z.object({ from: z.number(), to: z.number() });

/** The document of a sweep, as its engine writes it. */
export const sweepDocumentSchema = z.object({
  format: z.literal('severalty.sweep/1'),
  axis: z.enum(['quench-time', 'hold-time']),
  timeUnit: z.string(),
  unit: z.enum(['defect', 'pair']),
  alpha: z.number(),
  window: span,
  points: z.array(
    z.object({
      label: z.string(),
      time: z.number(),
      shots: z.int(),
      inWindow: z.boolean(),
      trials: z.int().nullable().optional().describe('N as stated'),
      misread: z.number().nullable().optional().describe('Rate at which a site is misread, as stated'),
      dataset: z
        .object({
          id: z.string(),
          digest: z.string(),
          verdict: verdictSchema.nullable(),
          dispersion: openInterval
            .nullish()
            .describe('Variance over ceiling of its newest diagnosis; the first documents did not have it')
        })
        .optional()
        .describe('Left out where the counts come from no saved dataset'),
      cumulants: z
        .tuple([interval, interval, interval])
        .nullable()
        .describe('κ1, κ2, κ3 with 95 % intervals; null where the counts take fewer than four values'),
      ratios: z.tuple([interval, interval]).nullable().describe('κ2/κ1 and κ3/κ1'),
      pairFactor: interval.nullish().describe('F2/F1², for hold times alone'),
      covariance: z
        .array(z.number())
        .nullish()
        .describe('Of the errors of κ1, κ2, κ3, 3 × 3 row by row; the first documents did not have it')
    })
  ),
  mixed: z
    .array(
      z.object({
        of: z.enum(['device', 'firmware', 'group']),
        stated: z.int().describe('Different ones that are stated'),
        unstated: z.int().describe('Datasets that state none')
      })
    )
    .optional()
    .describe('Conditions that differ between the datasets; left out where none does'),
  laws: z
    .object({
      quantities: z.int().describe('How many of κ1, κ2, κ3 a power law could be fitted to'),
      exponents: z.array(interval),
      logLevels: z.array(z.number()),
      middle: z.number(),
      chiSquare: z.number(),
      freedom: z.int(),
      p: chance.nullable(),
      common: z
        .object({
          exponent: interval,
          logLevels: z.array(z.number()),
          chiSquare: z.number(),
          freedom: z.int(),
          p: chance,
          z: z
            .number()
            .optional()
            .describe('The same surprise in standard errors; the first documents did not have it')
        })
        .describe('One exponent for all')
    })
    .nullable(),
  expected: z
    .object({
      dimension: z.number(),
      correlation: z.number(),
      dynamic: z.number(),
      exponent: z.number(),
      inside: z.boolean().nullable()
    })
    .nullable(),
  steady: z.array(
    z.object({
      id: z.enum(['variance-over-mean', 'third-over-mean', 'pair-factor']),
      steady: interval,
      chiSquare: z.number(),
      freedom: z.int(),
      p: chance.nullable(),
      references: z.array(
        z.object({ id: z.string(), value: z.number(), error: z.number(), inside: z.boolean() })
      )
    })
  ),
  windows: z.array(
    z.object({
      from: z.number(),
      to: z.number(),
      exponent: interval,
      commonP: chance,
      lawP: chance.nullable(),
      awayP: chance
        .nullish()
        .describe('Of an exponent so far from the whole window’s, all windows allowed for')
    })
  ),
  statement: z.string(),
  because: z.array(z.string()),
  cautions: z.array(z.string())
});

type Whole<T> = T extends object ? { [K in keyof T]-?: Whole<T[K]> } : T;
type Equal<A, B> = [A] extends [B] ? ([B] extends [A] ? true : false) : false;
/** Does not compile once the engine's document and this description part. */
export const isWhole: Equal<Whole<z.output<typeof sweepDocumentSchema>>, Whole<SweepReport>> = true;
