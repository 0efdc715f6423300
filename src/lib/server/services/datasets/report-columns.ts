import { sql } from 'drizzle-orm';
import type { Verdict } from '../../../stats/types';
import { dataset } from '../../db/schema';

/** Reports of a dataset that are not put aside. */
export const reportCount = sql<number>`(select count(*) from report r where r.dataset_id = ${dataset.id} and r.deleted_at is null)`;

/** Verdict of the newest of them. */
export const lastVerdict = sql<Verdict | null>`(select r.verdict from report r where r.dataset_id = ${dataset.id}
  and r.deleted_at is null order by r.number desc limit 1)`;

/** Variance over ceiling with its interval, as JSON, of the newest of them: its document is opened for it. */
export const lastDispersion = sql<
  string | null
>`(select json_extract(r.document, '$.moments.dispersion') from report r
  where r.dataset_id = ${dataset.id} and r.deleted_at is null order by r.number desc limit 1)`;
