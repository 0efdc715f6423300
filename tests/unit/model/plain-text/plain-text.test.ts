import { beforeAll, describe, expect, it } from 'vitest';
import { FLAGS, TESTS, VERDICTS } from '$lib/model/labels';
import { plainText } from '$lib/model/plain-text/plain-text';
import { defaultOptions } from '$lib/stats/default-options';
import { diagnose } from '$lib/stats/diagnose';
import type { CountData, Diagnosis } from '$lib/stats/types';

// Greenwood & Yule 1920, accidents: far over the ceiling.
const accidents: CountData = {
  kind: 'histogram',
  counts: [447, 132, 42, 21, 3, 2].map((shots, count) => [count, shots]),
  lump: null
};
/** 500 shots that wander over 200 counts, so that the table has to sum counts. */
const wide: CountData = {
  kind: 'shots',
  shots: Array.from({ length: 500 }, (_, shot) => 100 + ((shot * 67) % 200)),
  batches: Array.from({ length: 500 }, (_, shot) => String(shot % 5))
};
const options = { ...defaultOptions, resamples: 999 };
/** The text without the line breaks that wrapping put in. */
const flat = (text: string) => text.replace(/\s*\n\s*/g, ' ');

let ruledOut: Diagnosis;
let ordered: Diagnosis;
beforeAll(async () => {
  ruledOut = await diagnose(accidents, options);
  ordered = await diagnose(wide, { ...options, resamples: 49, trials: 400 });
});

describe('plainText', () => {
  it('answers first, and says every reason, flag, cause, test and caution of the document', () => {
    const text = plainText(ruledOut);
    expect(text.startsWith(`${VERDICTS[ruledOut.answer.verdict]}\n`)).toBe(true);
    expect(ruledOut.flags.length).toBeGreaterThan(0);
    const said = [
      ruledOut.answer.statement,
      ...ruledOut.answer.because,
      ...ruledOut.flags.flatMap(({ id, statement, size, otherCauses, next }) => [
        FLAGS[id],
        statement,
        size,
        ...otherCauses,
        ...next
      ]),
      ...ruledOut.tests.map(({ id }) => TESTS[id]),
      ...ruledOut.notRun.map(({ reason }) => reason),
      ruledOut.fit.how,
      ...ruledOut.cautions,
      ruledOut.data.digest
    ];
    for (const sentence of said) expect(flat(text)).toContain(sentence);
  });

  it('shows each count with its shots', () => {
    const rows = plainText(ruledOut)
      .split('Counts against the best law\n')[1]
      .split('\n\n')[0]
      .split('\n')
      .slice(1);
    expect(
      rows.map((row) =>
        row
          .trim()
          .split(/\s{2,}/)
          .slice(0, 2)
      )
    ).toEqual([
      ['0', '447'],
      ['1', '132'],
      ['2', '42'],
      ['3', '21'],
      ['4', '3'],
      ['5', '2']
    ]);
  });

  it('sums counts when there are many, without losing a shot', () => {
    const table = plainText(ordered).split('several counts a row')[1].split('\n\n')[0].split('\n').slice(2);
    expect(table.length).toBeLessThanOrEqual(30);
    const shots = table.map((row) => Number(row.trim().split(/\s{2,}/)[1]));
    expect(shots.reduce((sum, number) => sum + number, 0)).toBe(500);
  });

  it('says what is known of the order, and how the file was read', () => {
    const text = flat(plainText(ordered, ['Read as a shot list.']));
    expect(text).toContain('400 trials');
    expect(text).toContain('shots in order, in 5 batches');
    expect(text).toContain('Read as a shot list.');
    expect(flat(plainText(ruledOut))).toContain('trials unknown');
  });

  it('fits a terminal, but for the digest', () => {
    const long = plainText(ordered)
      .split('\n')
      .filter((line) => line.length > 80 && !line.includes('sha256:'));
    expect(long).toEqual([]);
  });
});
