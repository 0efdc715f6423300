import { thinTable } from '$lib/pdf/parts/thin-table';
import { describe, expect, it } from 'vitest';

const table = (rows: number) => ({
  columns: [{ title: 'count', kind: 'whole' as const }],
  rows: Array.from({ length: rows }, (_, i) => [i])
});
const kept = (rows: number, worth: (row: number) => boolean) => {
  const { table: thin, note } = thinTable(table(rows), worth);
  return { counts: thin.rows.map(([count]) => Number(count)), note };
};

describe('thinTable', () => {
  it('leaves a table of forty rows alone', () => {
    const { counts, note } = kept(40, () => false);
    expect(counts).toHaveLength(40);
    expect(note).toBe('');
  });

  it('leaves out the rows before and after what is worth telling', () => {
    const { counts, note } = kept(100, (row) => row >= 20 && row < 50);
    expect([counts.length, counts[0], counts.at(-1)]).toEqual([30, 20, 49]);
    expect(note).toBe(
      'Rows neither seen nor expected are left out. The document and the CSV files have all 100.'
    );
  });

  it('keeps odd and even counts alike, and the last one, when it skips', () => {
    const { counts, note } = kept(80, () => true);
    expect(counts.slice(0, 3)).toEqual([0, 3, 6]);
    expect(counts.at(-1)).toBe(79);
    expect(note).toContain('Every third row.');
    expect(kept(5001, () => true).note).toContain(
      'Every 127th row. The document and the CSV files have all 5\u202f001.'
    );
  });

  it('takes nothing worth telling for nothing to tell', () => {
    expect(kept(100, () => false).counts).toEqual([0]);
  });
});
