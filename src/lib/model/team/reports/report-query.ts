import { z } from 'zod';

export const REPORT_SORTS = ['made', 'dataset', 'device', 'verdict', 'shots', 'by'] as const;
export type ReportSort = (typeof REPORT_SORTS)[number];
export const REPORT_PAGE_SIZES = [25, 50, 100, 200] as const;

const word = z.string().trim().max(200).default('');

/** What the table of reports shows: every part of it stands in the address. An empty text filters nothing. */
export const reportQuerySchema = z.object({
  /** Words that must stand in the dataset's name, device, firmware version, group or notes. */
  q: word,
  verdict: z.enum(['', 'compatible', 'ruled-out', 'undecided']).default(''),
  device: word,
  /** Id of a dataset. */
  dataset: word,
  /** Only those on which a thread of remarks is open. */
  remarks: z.enum(['', 'open']).default(''),
  sort: z.enum(REPORT_SORTS).default('made'),
  order: z.enum(['up', 'down']).default('down'),
  page: z.coerce.number().int().min(1).max(1e6).default(1),
  size: z.coerce
    .number()
    .refine((size) => (REPORT_PAGE_SIZES as readonly number[]).includes(size))
    .default(50)
});

export type ReportQuery = z.infer<typeof reportQuerySchema>;

/** A query from an address: a part that is not understood counts as not given, as in an old bookmark. */
export function readReportQuery(search: URLSearchParams): ReportQuery {
  const query: Record<string, unknown> = reportQuerySchema.parse({});
  for (const [name, shape] of Object.entries(reportQuerySchema.shape)) {
    const given = search.get(name);
    if (given === null || given === '') continue;
    const read = shape.safeParse(given);
    if (read.success) query[name] = read.data;
  }
  return query as ReportQuery;
}

/** The query as the part of an address after `?`: only what differs from a fresh table. */
export function writeReportQuery(query: Partial<ReportQuery>): string {
  const fresh: Record<string, unknown> = reportQuerySchema.parse({});
  const search = new URLSearchParams();
  for (const [name, value] of Object.entries(query))
    if (value !== undefined && String(value) !== String(fresh[name])) search.set(name, String(value));
  return search.toString();
}
