import { readReportQuery, writeReportQuery, type ReportQuery } from '$lib/model/team/reports/report-query';
import { describe, expect, it } from 'vitest';

describe('the query of the table of reports', () => {
  it('comes back from the address it was written to', () => {
    const query = readReportQuery(
      new URLSearchParams('q=tern+3&verdict=ruled-out&sort=dataset&order=up&page=3&size=25')
    );
    expect(query).toMatchObject({ q: 'tern 3', verdict: 'ruled-out', sort: 'dataset', page: 3, size: 25 });
    expect(readReportQuery(new URLSearchParams(writeReportQuery(query)))).toEqual(query);
  });

  it('takes what it does not understand as not given', () => {
    const odd = new URLSearchParams('verdict=maybe&page=-1&size=7&sort=document&order=sideways');
    expect(readReportQuery(odd)).toEqual(readReportQuery(new URLSearchParams()));
  });

  it('writes nothing for a fresh table', () => {
    expect(writeReportQuery(readReportQuery(new URLSearchParams()))).toBe('');
    // As a form gives it: every part is a text.
    expect(writeReportQuery({ size: '50', verdict: '' } as unknown as ReportQuery)).toBe('');
  });
});
