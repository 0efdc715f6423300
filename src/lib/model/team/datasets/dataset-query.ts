import { z } from 'zod';
import { GEOMETRY_VALUES, isDay, UNIT_VALUES } from './conditions';
import { typedNumber } from './typed-number';

export const SORTS = [
  'name',
  'device',
  'firmware',
  'group',
  'quench',
  'geometry',
  'unit',
  'trials',
  'shots',
  'mean',
  'largest',
  'measured',
  'created',
  'by',
  'reports',
  'verdict'
] as const;
export type Sort = (typeof SORTS)[number];

export const PAGE_SIZES = [25, 50, 100, 200] as const;

const word = z.string().trim().max(200).default('');
const day = z.string().refine(isDay).or(z.literal('')).default('');
const number = z.string().trim().transform(typedNumber).pipe(z.number().min(0)).nullable().default(null);

/** What the table of datasets shows: every part of it stands in the address. An empty text filters nothing. */
export const datasetQuerySchema = z.object({
  q: word,
  device: word,
  firmware: word,
  group: word,
  geometry: z.enum(GEOMETRY_VALUES).or(z.literal('')).default(''),
  unit: z.enum(UNIT_VALUES).or(z.literal('')).default(''),
  /** Days of measurement, both included. */
  from: day,
  to: day,
  quenchFrom: number,
  quenchTo: number,
  /** Unit of the two above; times in ns, µs, ms and s are compared across units. */
  quenchUnit: z.string().trim().max(20).default('µs'),
  reports: z.enum(['', 'with', 'without']).default(''),
  verdict: z.enum(['', 'compatible', 'ruled-out', 'undecided']).default(''),
  /** Id of the person who saved it. */
  by: word,
  sort: z.enum(SORTS).default('created'),
  order: z.enum(['up', 'down']).default('down'),
  page: z.coerce.number().int().min(1).max(1e6).default(1),
  size: z.coerce
    .number()
    .refine((size) => (PAGE_SIZES as readonly number[]).includes(size))
    .default(50)
});

export type DatasetQuery = z.infer<typeof datasetQuerySchema>;
export const freshQuery = (): DatasetQuery => datasetQuerySchema.parse({});

/** A query from an address: a part that is not understood counts as not given, as in an old bookmark. */
export function readDatasetQuery(search: URLSearchParams): DatasetQuery {
  const query: Record<string, unknown> = freshQuery();
  for (const [name, shape] of Object.entries(datasetQuerySchema.shape)) {
    const given = search.get(name);
    if (given === null || given === '') continue;
    const read = shape.safeParse(given);
    if (read.success) query[name] = read.data;
  }
  return query as DatasetQuery;
}

/** The query as the part of an address after `?`: only what differs from a fresh table, so that addresses stay short. */
export function writeDatasetQuery(query: Partial<DatasetQuery>): string {
  const fresh: Record<string, unknown> = freshQuery();
  const search = new URLSearchParams();
  for (const [name, value] of Object.entries(query)) {
    if (value !== undefined && value !== null && String(value) !== String(fresh[name]))
      search.set(name, String(value));
  }
  // The unit says nothing without a time beside it.
  if (!search.has('quenchFrom') && !search.has('quenchTo')) search.delete('quenchUnit');
  return search.toString();
}
