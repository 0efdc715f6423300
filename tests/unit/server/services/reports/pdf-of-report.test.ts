import { pdfOfReport } from '$lib/server/services/reports/pdf-of-report';
import { describe, expect, it } from 'vitest';
import { freshDatabase } from '../../../../support/fresh-database';
import { makeMember, makeTeam } from '../../../../support/people';
import { makeDataset, makeReport } from '../../../../support/saved-reports';

describe('pdfOfReport', () => {
  it('prints a report of the team, twice the same, and knows none of another', async () => {
    const db = freshDatabase();
    const [ours, theirs] = [makeTeam(db), makeTeam(db)];
    const observer = makeMember(db, ours.id, 'observer');
    const datasetId = makeDataset(db, ours.id, observer.personId);
    const { id } = await makeReport(db, { teamId: ours.id, datasetId }, {}, 1_700_000_000_000);
    const address = 'https://severalty.example/team/x/reports/y';
    const made = await pdfOfReport(db, observer, id, address);
    if (!made.ok) throw new Error(made.reason);
    expect(Buffer.from(made.bytes.slice(0, 5)).toString()).toBe('%PDF-');
    expect(made.bytes.length).toBeLessThan(300_000);
    expect(made.name).toBe('Invented chain, report 1');
    expect(await pdfOfReport(db, observer, id, address)).toEqual(made);
    const stranger = makeMember(db, theirs.id, 'lead');
    expect(await pdfOfReport(db, stranger, id, address)).toEqual({ ok: false, reason: 'unknown' });
  });
});
