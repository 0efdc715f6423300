import { z } from 'zod';
import { listOf } from '../../list-of';
import { conditionsSchema } from '../datasets/conditions';
import { readingChoicesSchema } from '../datasets/reading-choices';
import { frozenConditionsSchema } from '../frozen-conditions';

/*
 * The files of a team's archive. Paths in it are made by us and are never used as paths of a disk; people are text.
 */

/** Conditions in an archive: one made before a condition existed lacks it, and nothing was stated then. */
export const archivedConditionsSchema = conditionsSchema.extend({
  group: conditionsSchema.shape.group.default(null),
  misreadUncertainty: conditionsSchema.shape.misreadUncertainty.default(null),
  kept: conditionsSchema.shape.kept.default(null)
});

/** Every path that may stand in an archive; anything else refuses the whole. */
export const ARCHIVE_PATH =
  /^(manifest\.json|README\.txt|team\.json|events\.json|(reports|sweeps)\.json|(datasets|reports|sweeps)\/\d{5}\.json|datasets\/\d{5}\.csv|originals\/[0-9a-f]{64})$/;

const when = z.iso.datetime();
const sha256 = z.string().regex(/^[0-9a-f]{64}$/);
const whole = z.int().nonnegative();

export const manifestSchema = z.object({
  format: z.literal('severalty.team/1'),
  madeAt: when,
  team: z.object({ name: z.string().max(200), slug: z.string().max(40) }),
  /** What was put aside is not in the archive. */
  leftOut: z.object({ datasets: whole, reports: whole, sweeps: whole.default(0) }),
  files: z.array(z.object({ path: z.string().regex(ARCHIVE_PATH), size: whole, sha256 })).max(65_000)
});

export const countsSchema = z.discriminatedUnion('kind', [
  z.strictObject({
    kind: z.literal('histogram'),
    counts: listOf(z.tuple([whole, whole])),
    lump: z.strictObject({ from: whole, shots: whole }).nullable(),
    below: z.strictObject({ to: whole, shots: whole }).optional()
  }),
  z
    .strictObject({
      kind: z.literal('shots'),
      shots: listOf(whole),
      batches: listOf(z.string()).nullable()
    })
    .refine(({ shots, batches }) => batches === null || batches.length === shots.length, {
      message: 'there must be one batch for each shot'
    })
]);

export const datasetFileSchema = z.strictObject({
  format: z.literal('severalty.dataset/1'),
  conditions: archivedConditionsSchema,
  counts: countsSchema,
  digest: z.string(),
  part: z.string().max(10_000).nullable(),
  reading: readingChoicesSchema,
  original: z.strictObject({ name: z.string().min(1).max(300), size: whole, sha256 }),
  createdAt: when,
  updatedAt: when
});

const remarkSchema = z.strictObject({
  section: z.string().min(1).max(60),
  body: z.string().min(1).max(20_000),
  signedAs: z.string().max(300),
  at: when,
  /** Place in this list of the remark that it answers. */
  thread: whole.nullable(),
  /** Place in `links` of the link that it came through. */
  link: whole.nullable(),
  settledAt: when.nullable()
});

const linkSchema = z.strictObject({
  label: z.string().max(300),
  audience: z.enum(['anyone', 'named', 'team']),
  people: z.array(z.string().max(254)).max(1000),
  shows: z.enum(['report', 'report-and-counts']),
  blind: z.boolean(),
  hidesReferees: z.boolean(),
  allowsRemarks: z.boolean(),
  visitLimit: z.int().positive().nullable(),
  visits: whole,
  createdAt: when,
  expiresAt: when.nullable(),
  revokedAt: when.nullable()
});

/** DiagnoseOptions. */
const optionsSchema = z.strictObject({
  trials: z.int().positive().nullable(),
  unit: z.enum(['defect', 'pair']),
  alpha: z.number().gt(0).lt(1),
  tolerance: z.number().nonnegative(),
  resamples: whole,
  seed: whole,
  misread: z.number().min(0).max(1).nullable(),
  misreadUncertainty: z.number().min(0).max(1).nullable().optional(),
  kept: z.strictObject({ from: whole, to: whole.nullable() }).nullable().optional(),
  geometry: z.enum(['sites', 'open-bonds', 'ring-bonds']),
  supplied: listOf(z.number().min(0).max(1)).nullable()
});

/** What is kept beside each report's document. */
export const reportsFileSchema = listOf(
  z.strictObject({
    file: z.string().regex(/^reports\/\d{5}\.json$/),
    dataset: z.string().regex(/^datasets\/\d{5}\.json$/),
    number: z.int().positive(),
    sha256,
    options: optionsSchema,
    conditions: frozenConditionsSchema,
    createdAt: when,
    remarks: listOf(remarkSchema),
    links: listOf(linkSchema)
  })
);

/** What is kept beside the document of each sweep. */
export const sweepsFileSchema = listOf(
  z.strictObject({
    file: z.string().regex(/^sweeps\/\d{5}\.json$/),
    name: z.string().min(1).max(300),
    notes: z.string().max(10_000).nullable(),
    sha256,
    options: z.strictObject({
      axis: z.enum(['quench-time', 'hold-time']),
      timeUnit: z.string().max(100),
      unit: z.enum(['defect', 'pair']),
      window: z.strictObject({ from: z.number(), to: z.number() }).nullable(),
      transition: z
        .strictObject({ dimension: z.number(), correlation: z.number(), dynamic: z.number() })
        .nullable(),
      alpha: z.number().gt(0).lt(0.5)
    }),
    engineVersion: z.string().max(100),
    /** As they were when the sweep was made, with the ids they had. */
    datasets: z
      .array(
        z.looseObject({
          id: z.string().max(100),
          name: z.string().max(300),
          digest: z.string().max(200),
          device: z.string().nullable(),
          firmware: z.string().nullable(),
          group: z.string().nullable()
        })
      )
      .max(1000),
    createdAt: when
  })
);

export const teamFileSchema = z.object({
  name: z.string().max(200),
  slug: z.string().max(40),
  members: listOf(z.object({ name: z.string(), email: z.string(), role: z.string(), since: when })),
  /** Who saved a dataset or made a report, by its path: text, matched with nobody. */
  madeBy: z.record(z.string(), z.string().max(700))
});

export type Manifest = z.infer<typeof manifestSchema>;
export type DatasetFile = z.infer<typeof datasetFileSchema>;
export type SweepsFile = z.infer<typeof sweepsFileSchema>;
export type ReportsFile = z.infer<typeof reportsFileSchema>;
export type TeamFile = z.infer<typeof teamFileSchema>;
