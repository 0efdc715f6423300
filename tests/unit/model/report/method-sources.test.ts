import { METHOD_SOURCES } from '$lib/model/report/method-sources';
import { SOURCES_BY_YEAR } from '$lib/model/quote/sources';
import { describe, expect, it } from 'vitest';
import { sourceFiles } from '../../../support/source-files';

const SAID = METHOD_SOURCES.map(([, sources]) => sources).join(' ');
/** Folders of the engine that hold statistics; the rest is arithmetic, search and random numbers. */
const METHOD = ['bounds', 'laws', 'misread', 'multiple', 'order', 'references', 'resampling'];
/** Named in the code beside the source that the method rests on, or for no number of a report. */
const BESIDE = ['Benjamini 1995', 'Box 1970', 'Mood 1940', 'Boucheron 2013', 'Neumaier 1974'];
/** First author and year of A 1950; A & B 1950; A, B & C 1950. */
const SOURCE = /(\p{Lu}[\p{L}’]+)(?:(?:, | & | and )\p{Lu}[\p{L}’]+)*,? ((?:18|19|20)\d\d)\b/gu;

describe('the sources of the method', () => {
  it('have every source that the statistics name', () => {
    const named = sourceFiles(METHOD.map((folder) => `src/lib/stats/${folder}`)).flatMap(({ path, text }) =>
      [...text.replace(/\n \* /g, ' ').matchAll(SOURCE)].map(([, first, year]) => ({ path, first, year }))
    );
    // Fewer means that this test no longer reads them.
    expect(named.length).toBeGreaterThan(20);
    const missing = named.filter(
      ({ first, year }) =>
        !BESIDE.includes(`${first} ${year}`) && !new RegExp(`${first}[^.;]* ${year}`).test(SAID)
    );
    expect(missing).toEqual([]);
  });

  it('have every source that the methods paragraph cites', () => {
    for (const cited of Object.values(SOURCES_BY_YEAR)) expect(SAID).toContain(cited);
  });
});
