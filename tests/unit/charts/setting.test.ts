import { alignedColumn } from '$lib/charts/aligned-column';
import { powerTick } from '$lib/charts/power-tick';
import { residualTicks } from '$lib/charts/residual-ticks';
import { roomyTicks } from '$lib/charts/roomy-ticks';
import { sayShare } from '$lib/charts/say-share';
import { scaledTexts } from '$lib/charts/scaled-texts';
import { splitRaised } from '$lib/charts/split-raised';
import { tableToCsv } from '$lib/charts/table-to-csv';
import { tickTexts } from '$lib/charts/tick-texts';
import { wrapped } from '$lib/charts/wrapped';
import { scaleLinear } from 'd3-scale';
import { describe, expect, it } from 'vitest';

describe('numbers on axes and in tables', () => {
  it('ticks share their decimals, with a real minus and thin spaces', () => {
    expect(tickTexts([-0.5, 0, 0.5])).toEqual(['\u22120.5', '0.0', '0.5']);
    expect(tickTexts([0, 0.05, 0.1], 100, ' %')).toEqual(['0 %', '5 %', '10 %']);
    expect(tickTexts([0, 5000, 10000])).toEqual(['0', '5\u2009000', '10\u2009000']);
    expect(tickTexts([0, 0.00025])).toEqual(['0.0000', '0.0003']);
    expect(tickTexts([7])).toEqual(['7']);
  });
  it('powers of ten raise their exponent', () => {
    expect(powerTick(0)).toEqual({ text: '1' });
    expect(powerTick(-2)).toEqual({ text: '0.01' });
    expect(powerTick(-12)).toEqual({ text: '10', raised: '\u221212' });
  });
  it('a column stands on its decimal points', () => {
    const texts = alignedColumn([12.5, -0.25, 3, null, 1234567, 2.5e-9], 'number');
    const after = (text: string) =>
      text.includes('.') ? text.length - text.indexOf('.') : text.replace(/\u00a0+$/, '').length;
    expect(
      new Set(
        texts.map(
          (text) =>
            text.length - (text.indexOf('.') < 0 ? text.replace(/\u00a0+$/, '').length : text.indexOf('.'))
        )
      ).size
    ).toBe(1);
    expect(after(texts[0])).toBeGreaterThan(2);
    expect(texts[1].trim()).toBe('\u22120.2500');
    expect(texts[3].trim()).toBe('–');
    expect(texts[5].trim()).toBe('2.500 × 10⁻⁹');
  });
  it('shares are said in per cent, and once in so many when they are small', () => {
    expect(sayShare(0.1234)).toBe('12.3\u202f%');
    expect(sayShare(0.0123)).toBe('1.2\u202f%');
    expect(sayShare(0.00042)).toBe('1 in 2\u202f400');
    expect(sayShare(0)).toBe('0');
  });
  it('raised digits are found wherever they stand', () => {
    expect(splitRaised('lies 2.8 × 10⁻⁶ nats')).toEqual([
      { text: 'lies 2.8 × 10', raised: '\u22126' },
      { text: ' nats', raised: '' }
    ]);
    expect(splitRaised('plain')).toEqual([{ text: 'plain', raised: '' }]);
    expect(splitRaised('')).toEqual([]);
  });
  it('lines break at spaces, and long words stand alone', () => {
    expect(wrapped('one two three', 7)).toEqual(['one two', 'three']);
    expect(wrapped('unbreakable x', 4)).toEqual(['unbreakable', 'x']);
  });
  it('ticks that would touch give way, in round steps', () => {
    const texts = (domain: [number, number], width: number) =>
      roomyTicks(scaleLinear(domain, [0, width]), 13).map(({ text }) => text);
    expect(texts([0, 4], 260)).toEqual(['0', '1', '2', '3', '4']);
    expect(texts([0, 999_996], 180)).toEqual(['0', '500\u2009000']);
    expect(texts([0, 1e6], 180)).toEqual(['0', '500\u2009000']);
  });
  it('labels too long for their margin leave a power of ten to the title', () => {
    expect(scaledTexts([0, 0.00005, 0.0001])).toEqual({ texts: ['0.0', '0.5', '1.0'], exponent: -4 });
    expect(scaledTexts([0, 100_000, 200_000])).toEqual({ texts: ['0', '1', '2'], exponent: 5 });
    expect(scaledTexts([0, 0.5, 1])).toEqual({ texts: ['0.0', '0.5', '1.0'], exponent: 0 });
  });
  it('residuals have a round step to either side, as a power where they are large', () => {
    expect(residualTicks(1.6).map(({ text }) => text)).toEqual(['\u22121', '0', '1']);
    expect(residualTicks(97).map(({ at }) => at)).toEqual([-50, 0, 50]);
    expect(residualTicks(2.3e6)).toEqual([
      { at: -2e6, text: '\u22122×10', raised: '6' },
      { at: 0, text: '0' },
      { at: 2e6, text: '2×10', raised: '6' }
    ]);
  });
});

describe('tableToCsv', () => {
  it('quotes what must be quoted and keeps every digit', () => {
    const csv = tableToCsv({
      columns: [
        { title: 'a, b', kind: 'text' },
        { title: 'p', kind: 'number' }
      ],
      rows: [
        ['say "x"', 0.1 + 0.2],
        [null, 1e-300]
      ]
    });
    expect(csv).toBe('"a, b",p\r\n"say ""x""",0.30000000000000004\r\n,1e-300\r\n');
  });
});
