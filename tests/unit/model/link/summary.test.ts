import { differentCounts, hidesCounts } from '$lib/model/link/hides-counts';
import { withoutCounts } from '$lib/model/link/summary';
import { defaultOptions } from '$lib/stats/default-options';
import { diagnose } from '$lib/stats/diagnose';
import type { Diagnosis, Histogram } from '$lib/stats/types';
import { beforeAll, describe, expect, it } from 'vitest';
import { nineCounts } from '../../../support/links';

/** Invented: the nine counts taken seven times over, less a few, so that numbers have many digits. */
const histogram = (times: number, lump: Histogram['lump'] = null): Histogram => ({
  kind: 'histogram',
  counts: (nineCounts as Histogram).counts.map(([count, shots]) => [
    count,
    Math.max(1, times * shots - count)
  ]),
  lump
});
const run = (counts: Histogram) =>
  diagnose(counts, { ...defaultOptions, trials: 24, resamples: 1234, seed: 98765 });

let few: Diagnosis, many: Diagnosis, lumped: Diagnosis, bunched: Diagnosis;

beforeAll(async () => {
  [few, many, lumped] = [
    await run(histogram(1)),
    await run(histogram(7)),
    await run(histogram(3, { from: 9, shots: 411 }))
  ];
  bunched = await run({
    kind: 'histogram',
    counts: Array.from({ length: 14 }, (_, i): [number, number] => [i, 301 - 17 * i]),
    lump: null
  });
});

/** Significant digits of a number as JSON writes it. */
const digitsOf = (value: number): number =>
  String(Math.abs(value)).replace(/e.*$/, '').replace('.', '').replace(/^0+/, '').replace(/0+$/, '').length;

/** Path and value of every number that is in no interval, of every interval, and of every sentence. */
function walk(value: unknown, path = ''): [path: string, value: unknown][] {
  if (Array.isArray(value)) return value.flatMap((of, i) => walk(of, `${path}.${i}`));
  if (typeof value !== 'object' || value === null) return [[path, value]];
  if ('low' in value && 'high' in value) return [[path, value]];
  return Object.entries(value).flatMap(([key, of]) => walk(of, path ? `${path}.${key}` : key));
}

describe('a report without its counts', () => {
  it('has nothing at more than three digits, but the limits of intervals by their width', () => {
    for (const document of [few, many, lumped, bunched]) {
      const summary = withoutCounts(document);
      let numbers = 0;
      for (const [path, value] of walk(summary)) {
        // Told as they are: what was set before anything was counted, and the number of shots.
        if (/^data\.(shots|trials|batches|misread)$|^engine\.(alpha|tolerance|version)$|^format$/.test(path))
          continue;
        if (typeof value === 'number') {
          numbers++;
          expect(digitsOf(value), `${path} ${value}`).toBeLessThanOrEqual(path.startsWith('tests') ? 2 : 3);
        } else if (typeof value === 'object' && value !== null) {
          const { value: near, low, high } = value as Record<string, number | null>;
          if (near === null || low === null || high === null || high === low) continue;
          const unit = 10 ** (Math.floor(Math.log10(high - low)) - 1);
          // Rounding outward may carry the width over a power of ten, to units ten times finer than it then has.
          for (const one of [near, low, high])
            expect(
              Math.abs((10 * one) / unit - Math.round((10 * one) / unit)),
              `${path} ${one}`
            ).toBeLessThan(1e-5);
          expect((high - low) / unit).toBeLessThan(100.5);
        } else if (typeof value === 'string' && /^answer|^flags/.test(path)) {
          for (const [found] of value.matchAll(/\d[\d\u202f]*(?:\.\d+)?/g)) {
            const number = Number(found.replaceAll('\u202f', ''));
            if (number !== document.data.shots) expect(digitsOf(number), value).toBeLessThanOrEqual(3);
          }
        }
      }
      expect(numbers).toBeGreaterThan(8);
    }
  });

  it('tells neither seed nor resamples, in numbers or words', () => {
    expect(JSON.stringify(bunched)).toMatch(
      /, 1\u202f234 resamples\)[\s\S]*smallest p that 1\u202f234 resamples/
    );
    expect(JSON.stringify(few)).toMatch(/draws made stand with each test/);
    for (const document of [few, many, lumped, bunched]) {
      expect(JSON.stringify(document)).toMatch(/98765.*1234/);
      const text = JSON.stringify(withoutCounts(document));
      expect(text).not.toMatch(
        /98765|\b1234\b|1\u202f234|"seed"|"resamples"|"smallestP"|\d resamples|draws made/
      );
    }
  });

  it('shows third and fourth cumulant, divergence and law from 10 000 shots on', () => {
    expect(few.data.shots).toBeLessThan(10_000);
    const small = withoutCounts(few);
    expect([small.moments.third, small.moments.fourth, small.fit.law, small.fit.divergenceInterval]).toEqual([
      null,
      null,
      null,
      null
    ]);
    expect(many.data.shots).toBeGreaterThan(10_000);
    const large = withoutCounts(many);
    expect(large.moments.third?.value).toBeCloseTo(many.moments.third.value!, 1);
    expect(large.fit.law?.levels.length).toBe(many.fit.levels.length);
    expect(large.fit.divergenceInterval).not.toBeNull();
  });

  it('says that the last row lumps counts, and keeps the caution', () => {
    expect(withoutCounts(lumped).data.lumped).toBe(true);
    expect(withoutCounts(lumped).cautions[0]).toMatch(
      /^The last row lumps counts of 9 and more\..*lower limits/
    );
    expect(withoutCounts(few).data.lumped).toBe(false);
  });
});

it('is made from 1000 shots and 8 different counts on', () => {
  const of = (rows: number, shots: number, lump: Histogram['lump'] = null) => ({
    data: { counts: Array.from({ length: rows }, (_, i): [number, number] => [i, 1]), shots, lump }
  });
  expect(hidesCounts(of(8, 1000))).toBe(true);
  expect(hidesCounts(of(8, 999))).toBe(false);
  expect(hidesCounts(of(7, 1000))).toBe(false);
  expect(hidesCounts(of(7, 1000, { from: 7, shots: 3 }))).toBe(true);
  expect(
    differentCounts({
      data: {
        counts: [
          [0, 5],
          [1, 0]
        ],
        shots: 5,
        lump: null
      }
    })
  ).toBe(1);
});
