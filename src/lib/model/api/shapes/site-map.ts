import { z } from 'zod';
import { LENGTHS } from '../../team/datasets/conditions';
import { momentSchema } from './moment';

const geometry = z.enum(['chain', 'ring']).describe('How the sites are neighbours, in their order');
const seek = z
  .enum(['any', 'rise'])
  .describe(
    'rise: only positive correlations are looked for, neighbours first; to be declared before the data are seen'
  );

export const siteMapSchema = z.object({
  id: z.string(),
  name: z.string(),
  geometry,
  seek,
  alpha: z.number().describe('Chance of any false alarm among all pairs'),
  sites: z.int(),
  shots: z.int(),
  device: z.string().nullable(),
  firmware: z.string().nullable(),
  group: z.string().nullable(),
  statement: z.string().describe('The answer in one sentence'),
  countsDataset: z.string().nullable().describe('Id of the dataset of excited sites'),
  kinksDataset: z.string().nullable().describe('Id of the dataset of kinks; null when they were not kept'),
  createdAt: momentSchema
});

const text = (most: number) => z.string().trim().min(1).max(most).optional();

/** What is said about site-resolved shots, in the query of their address. */
export const newSiteMapQuery = z.strictObject({
  name: text(180).describe('What the team calls it'),
  geometry: geometry.default('chain'),
  seek: seek.default('any'),
  alpha: z.coerce.number().gt(0).lt(1).default(0.05).describe('Chance of any false alarm among all pairs'),
  device: text(LENGTHS.device),
  firmware: text(LENGTHS.firmware),
  group: text(100).describe('Part of the device that was measured'),
  kinks: z.enum(['keep', 'leave']).default('leave').describe('Whether kinks are kept as a dataset too')
});

const moments = z.object({ mean: z.number(), variance: z.number(), trials: z.int() });
const chance = z.object({ power: z.number(), shots: z.number().nullable() });

/** The document of a map. */
export const sitesDocumentSchema = z.object({
  format: z.literal('severalty.sites/1'),
  engineVersion: z.string(),
  geometry,
  alpha: z.number(),
  seek,
  names: z.array(z.string()).describe('Sites in their order'),
  shots: z.int(),
  excited: z.array(z.int()).describe('Shots on which each site was excited'),
  counts: z.object({ sites: moments, kinks: moments.nullable() }),
  pairs: z
    .array(
      z.object({
        first: z.int(),
        second: z.int(),
        distance: z.int(),
        together: z.int(),
        correlation: z.number().nullable(),
        low: z.number().nullable(),
        high: z.number().nullable(),
        p: z.number(),
        pHolm: z.number(),
        pFalseShare: z.number()
      })
    )
    .describe('Every pair of sites, numbered from 0, with its 95 % interval'),
  byDistance: z.array(
    z.object({
      distance: z.int(),
      pairs: z.int(),
      value: z.number().nullable(),
      low: z.number().nullable(),
      high: z.number().nullable()
    })
  ),
  common: z.object({
    pairs: z.int(),
    mean: z.number().nullable(),
    positive: z.number().nullable(),
    p: z.number().nullable(),
    shown: z.boolean()
  }),
  power: z.object({
    correlation: z.number(),
    rate: z.number(),
    neighbour: chance,
    distant: chance.nullable()
  }),
  inCounts: z.object({
    correlation: z.number(),
    excess: z.number(),
    smallestExcess: z.number(),
    visible: z.boolean(),
    statement: z.string(),
    shotsNeeded: z.int().nullable().describe('Null where no number of shots shows it')
  }),
  statement: z.string(),
  because: z.array(z.string()),
  cautions: z.array(z.string())
});
