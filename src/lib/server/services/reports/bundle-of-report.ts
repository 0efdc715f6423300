import { and, eq, isNull } from 'drizzle-orm';
import type { BundleInput } from '$lib/model/exports/bundle-input';
import type { CountData } from '$lib/stats/types';
import type { Database } from '../../db/client';
import { dataset, originalFile, team } from '../../db/schema';
import type { Actor } from '../access/actor';
import { mayWhere } from '../access/may-where';
import { safeFileName } from '../datasets/safe-file-name';
import { pdfOfReport } from './pdf-of-report';
import { readReport } from './read-report';

export type BundleOfReport =
  | { ok: true; name: string; input: Omit<BundleInput, 'charts'> }
  | { ok: false; reason: 'unknown' }
  | { ok: false; reason: 'unreadable'; problem: string };

/**
 * All that a bundle of a report takes from the database, the report for print included; the charts are the caller's.
 * The uploaded file comes along when it holds this dataset alone.
 *
 * @param address where the report can be read, told in it
 */
export async function bundleOfReport(
  db: Database,
  actor: Actor,
  id: string,
  address: string
): Promise<BundleOfReport> {
  const read = readReport(db, actor, id);
  if (!read.ok) return read;
  const { report, document } = read;
  if (!document.ok) return { ok: false, reason: 'unreadable', problem: document.problem };
  const found = db
    .select({
      counts: dataset.counts,
      part: dataset.part,
      team: team.name,
      file: { name: originalFile.name, bytes: originalFile.bytes }
    })
    .from(dataset)
    .innerJoin(originalFile, eq(originalFile.id, dataset.fileId))
    .innerJoin(team, eq(team.id, dataset.teamId))
    .where(
      and(eq(dataset.id, report.datasetId), mayWhere(actor, 'see', dataset.teamId), isNull(dataset.deletedAt))
    )
    .get();
  if (!found) return { ok: false, reason: 'unknown' };
  const pdf = await pdfOfReport(db, actor, id, address);
  if (!pdf.ok) return pdf;
  const { conditions, number, by, createdAt, options, text } = report;
  const when = new Date(createdAt).toISOString().slice(0, 16).replace('T', ' ');
  return {
    ok: true,
    name: pdf.name,
    input: {
      document: document.diagnosis,
      documentText: text,
      data: JSON.parse(found.counts) as CountData,
      supplied: options.supplied,
      about: [
        `Report ${number} of ${conditions.name}, team ${found.team}. Made ${by === null ? '' : `by ${by}, `}${when} UTC.`,
        `Members of the team can read it at ${address}`
      ],
      conditions,
      pdf: pdf.bytes,
      original: found.part === null ? { name: safeFileName(found.file.name), bytes: found.file.bytes } : null
    }
  };
}
