import { alignedColumn } from '$lib/charts/aligned-column';
import { cumulantsPlace } from '$lib/charts/cumulants-place';
import { cumulantsTable } from '$lib/charts/cumulants-table';
import { documentCsv } from '$lib/model/document-csv';
import { sayData } from '$lib/model/plain-text/say-data';
import { sayLumpedLimits } from '$lib/model/report/say-lumped-limits';
import { sayNuisances } from '$lib/model/report/say-nuisances';
import { describe, expect, it } from 'vitest';
import { anyDiagnosis, WELDON } from '../../charts/any-diagnosis';

const reason = /κ₃ and κ₄ are not known: they hang most on the counts far from the mean/;
const unknown = { value: null, low: null, high: null };

describe.each([
  ['above', () => anyDiagnosis(WELDON.slice(0, 10), { trials: 12 }, { from: 10, shots: 18 })],
  ['below', () => anyDiagnosis(WELDON.slice(3), { trials: 12 }, null, { to: 2, shots: 4599 })]
])('counts lumped %s', (_side, make) => {
  it('have no third and fourth cumulant, and every way to read the report says why', async () => {
    const document = await make();
    expect(document.moments.third).toEqual(unknown);
    expect(document.moments.fourth).toEqual(unknown);
    expect(document.moments.variance.value).not.toBeNull();
    expect(document.cautions.join(' ')).toContain('Third and fourth cumulant are not known.');
    const { columns, rows } = cumulantsTable(document);
    for (const name of ['κ₃', 'κ₄']) {
      const row = rows.find(([first]) => first === name)!;
      expect(columns.slice(1).map(({ kind }, i) => alignedColumn([row[i + 1]], kind)[0].trim())).toEqual([
        '–',
        '–',
        '–'
      ]);
    }
    const place = cumulantsPlace(document);
    expect('reason' in place && place.reason).toMatch(reason);
    expect(sayData(document, []).replace(/\s+/g, ' ')).toMatch(reason);
    expect(sayNuisances(document, null).flat().join(' ')).toMatch(reason);
    const csv = documentCsv(document);
    expect(csv).toMatch(/^moments,third,,,,$/m);
    const { mean } = document.nuisances!.lumped!;
    expect(csv).toContain(`whatever the lumps hide,mean,,,${mean.low},${mean.high}`);
  });

  it('of an older document keep its numbers, and nothing is said to be unknown', async () => {
    const document = await make();
    const older = {
      ...document,
      moments: { ...document.moments, third: { value: 0.8, low: 0.7, high: 0.9 } }
    };
    expect(sayLumpedLimits(older).join()).not.toMatch(/not known/);
    expect(cumulantsTable(older).rows.find(([name]) => name === 'κ₃')).toEqual(['κ₃', 0.8, 0.7, 0.9]);
  });
});

it('whole rows keep both cumulants', async () => {
  const { moments } = await anyDiagnosis(WELDON, { trials: 12 });
  expect(moments.third.value).not.toBeNull();
  expect(moments.fourth.value).not.toBeNull();
});
