import { withoutCounts } from '$lib/model/link/summary';
import { EXPLANATIONS } from '$lib/model/labels';
import { inNotation } from '$lib/model/quote/notation/notation';
import { NOTATIONS } from '$lib/model/quote/notation/notations';
import { NO_PROVENANCE } from '$lib/model/quote/provenance';
import { quoteOf } from '$lib/model/quote/quote-of';
import type { Diagnosis } from '$lib/stats/types';
import { beforeAll, describe, expect, it } from 'vitest';
import { quotedDocuments, type QuotedDocument } from '../../../support/quoted-documents';
import { expectInterval, isRounded, NUMBER, numbersOf, read } from './printed-numbers';

let documents: QuotedDocument[];

beforeAll(async () => {
  documents = await quotedDocuments();
});

const plain = (document: Parameters<typeof quoteOf>[0]) => {
  const { result, methods } = quoteOf(document, NO_PROVENANCE);
  return { result: inNotation(result, 'plain'), methods: inNotation(methods, 'plain') };
};

describe('the words of every fixture', () => {
  it('come in all three answers', () => {
    expect(new Set(documents.map(({ document }) => document.answer.verdict)).size).toBe(3);
    expect(documents.length).toBeGreaterThan(30);
  });

  it('tell mean, variance, ratio and divergence of the document, with their limits', () => {
    let told = 0;
    for (const { document } of documents) {
      const { result } = plain(document);
      const { mean, variance, dispersion } = document.moments;
      if (!variance.value) continue;
      told++;
      expectInterval(result, 'The mean is ', mean);
      expectInterval(result, 'the variance ', variance);
      if (dispersion.value !== null) expectInterval(result, 'which is ', dispersion);
      expectInterval(result, 'D = ', document.fit.divergenceInterval);
      expect(isRounded(/G² is (.*?)\. (?=[A-Z]|$)/.exec(result)![1], document.fit.gSquared)).toBe(true);
    }
    expect(told).toBeGreaterThan(25);
  });

  it('tell shots, trials and the leading test', () => {
    for (const { name, document } of documents) {
      const { result } = plain(document);
      const { shots, trials, unit } = document.data;
      const told = new RegExp(`^The counts of (?:one shot|(${NUMBER}) shots) `).exec(result);
      expect(told?.[1] ? read(told[1]).value : 1, name).toBe(shots);
      if (trials === null) expect(result).toContain('with an unknown number of trials');
      else
        expect(read(new RegExp(`N(?:/2)? = (${NUMBER})`).exec(result)![1]).value).toBe(
          unit === 'pair' ? trials / 2 : trials
        );
      const leading = [...document.tests].sort((a, b) => a.pAdjusted - b.pAdjusted || a.p - b.p)[0];
      const p = new RegExp(`\\(p ([=≤]) (${NUMBER})[^()]*\\)\\.`, 'g');
      const [, sign, printed] = [...result.matchAll(p)].at(-1) ?? [];
      if (!leading) {
        expect(printed).toBeUndefined();
        continue;
      }
      expect(isRounded(printed, leading.p), `${printed} for ${leading.p}`).toBe(true);
      expect(sign).toBe(leading.p <= leading.smallestP ? '≤' : '=');
      // The words beside the number say the same: once in 1/p repeats, to two digits.
      const often =
        /(?:once in ([^a-z]+)|in (\d+) of 100|in practically every) repeats? of the experiment if/.exec(
          result
        )!;
      if (often[1]) expect(Math.abs(read(often[1]).value * read(printed).value - 1)).toBeLessThan(0.06);
      if (often[2]) expect(Number(often[2])).toBe(Math.round(100 * read(printed).value));
    }
  });

  it('tell which story leads where independence is ruled out, with its number, and which lie with it', () => {
    const seen = { tied: 0, alone: 0, unfit: 0 };
    for (const { name, document } of documents) {
      const { result } = plain(document);
      const { explanations } = document;
      const found = /Of the explanations fitted, the nearest to the counts by AIC is (.*?)\. (?=[A-Z])/.exec(
        result
      );
      if (!explanations) {
        expect(found, name).toBeNull();
        continue;
      }
      const [first, ...others] = explanations.ranked;
      const near = others.filter(({ id }) => explanations.tied.includes(id));
      const [lead, tie = ''] = found![1].split('; less than 2 behind, ');
      expect(lead.startsWith(EXPLANATIONS[first.id]), name).toBe(true);
      const { symbol, value, low, high } = first.parameter!;
      expectInterval(lead, symbol.length === 1 ? `${symbol} = ` : `${symbol} `, { value, low, high });
      expect(tie === '', name).toBe(near.length === 0);
      for (const { id } of others)
        expect(tie.includes(EXPLANATIONS[id])).toBe(near.some((one) => one.id === id));
      const [, sign, p] = new RegExp(`and p ([=≤]) (${NUMBER}) for its own fit`).exec(lead)!;
      expect(isRounded(p, first.goodness!.p)).toBe(true);
      const unfit = first.goodness!.p <= Math.max(document.engine.alpha, first.goodness!.smallestP);
      expect(sign).toBe(first.goodness!.p <= first.goodness!.smallestP ? '≤' : '=');
      expect(lead.endsWith('; yet it does not fit them either')).toBe(unfit);
      seen.tied += Number(near.length > 0);
      seen.alone += Number(near.length === 0);
      seen.unfit += Number(unfit);
    }
    for (const [what, times] of Object.entries(seen)) expect(times, what).toBeGreaterThan(0);
  });

  it('hold no number that is not the document’s', () => {
    const always = [95, 5, 100, 50, 1, 2, 10, 1934, 1936, 1956, 1978, 1979, 1991, 1993, 1994, 1997];
    for (const { name, document } of documents) {
      const { resamples, tolerance } = document.engine;
      const { smallestExcess } = document.answer;
      const own = numbersOf(document).concat(
        always,
        1 / (resamples + 1),
        100 * tolerance,
        (document.data.misread ?? 0) * 100,
        (smallestExcess ?? 0) * 100,
        (document.data.trials ?? 0) / 2,
        document.tests.length
      );
      const { result, methods } = plain(document);
      const text = `${result} ${methods}`
        .replace(document.data.digest.slice(7), '')
        .replaceAll('sha256', '')
        .replace(`engine ${document.engine.version}`, '')
        // Checked against p above.
        .replace(/once in [^a-z]+ repeats|in \d+ of 100 repeats/g, '');
      for (const [printed] of text.matchAll(new RegExp(NUMBER, 'g')))
        expect(
          own.some((value) => isRounded(printed, value)),
          `${printed} of ${name}`
        ).toBe(true);
    }
  });

  it('never claim more than the answer', () => {
    for (const { document } of documents) {
      const { result, methods } = plain(document);
      for (const text of [result, methods]) {
        expect(text).not.toMatch(/\bprov(e|es|ed|en|ing)\b/i);
        expect(text).not.toMatch(/are independent|is independent\b(?! trials)|significan/i);
        expect(text).not.toMatch(/undefined|NaN|null|Infinity|\[object| {2}|\.\.|,,| – |^\s|\s$/);
        expect(text).toMatch(/^[A-Z].*\.$/);
      }
      const said = {
        compatible: 'are compatible with independent trials',
        'ruled-out': 'rule out independent trials',
        undecided: 'leave it undecided'
      };
      expect(result).toContain(said[document.answer.verdict]);
      expect(result.includes('This does not tell the cause')).toBe(document.answer.verdict === 'ruled-out');
      expect(result.includes('Compatible is not the same as independent')).toBe(
        document.answer.verdict === 'compatible'
      );
    }
  });

  it('cite what was used and nothing else', () => {
    const seen = { stopped: 0, order: 0, none: 0 };
    for (const { document } of documents) {
      const { methods } = plain(document);
      const cites = (source: string) => methods.includes(source);
      const { certificate } = document.tails;
      const stopped = document.tests.some((test) => test.stoppedEarly);
      const ordered = document.tests.some(({ id }) => id === 'order');
      expect(cites('Hoeffding 1956')).toBe(certificate !== null);
      expect(cites('Clopper and Pearson 1934')).toBe(certificate !== null && document.data.trials !== null);
      expect(cites('Garwood 1936')).toBe(certificate !== null && document.data.trials === null);
      expect(cites('Besag and Clifford 1991')).toBe(stopped);
      expect(cites('Ljung and Box 1978')).toBe(ordered);
      expect(cites('Holm 1979')).toBe(document.tests.length > 1);
      seen.stopped += Number(stopped);
      seen.order += Number(ordered);
      seen.none += Number(document.tests.length === 0);
    }
    for (const [what, times] of Object.entries(seen)) expect(times, what).toBeGreaterThan(0);
  });

  it('are the same words in every notation', () => {
    // Symbols, numbers and marks taken off, each notation leaves the same letters.
    const bare = (text: string) =>
      text.replace(/\\(emph|texttt|allowbreak|times|mu|alpha|rho|theta|varepsilon|le)\b|[^A-Za-z]/g, '');
    for (const { document } of documents) {
      const quote = quoteOf(document, NO_PROVENANCE);
      for (const words of [quote.result, quote.methods])
        expect(
          new Set(NOTATIONS.map((notation) => bare(inNotation(words, notation).replaceAll('ß', '')))).size
        ).toBe(1);
    }
  });
});

describe('a report without its counts', () => {
  it('is quoted from its summary alone', () => {
    for (const { document } of documents as { document: Diagnosis }[]) {
      const summary = withoutCounts(document);
      const quote = quoteOf(summary, { ...NO_PROVENANCE, url: 'https://example.org/link/abc' });
      const { result, methods } = plain(summary);
      expect(`${methods} ${quote.bibtex}`).not.toMatch(/[0-9a-f]{16}|seed|sha256/);
      expect(methods).not.toContain('certificate');
      expect(result).not.toMatch(/G²|undefined|null|NaN/);
      if (summary.moments.variance.value) expectInterval(result, 'The mean is ', summary.moments.mean);
    }
  });
});
