import type { Reading } from '$lib/charts/picture';
import { walkedTo } from '$lib/charts/reading/walked-to';
import { writtenReadings } from '$lib/charts/reading/written-readings';
import script from 'virtual:first-reading';
import { describe, expect, it } from 'vitest';

const picture = (number: number) => ({
  width: 836,
  height: 460,
  build: 'field' as const,
  marks: [],
  legend: [],
  notes: [],
  order: 'across' as const,
  readings: Array.from({ length: number }, (_, i): Reading => ({
    x: i + 0.123,
    y: 2,
    words: () => `Count ${i}: "<" 10⁻³`
  }))
});

const press = (key: string, held: Partial<KeyboardEvent> = {}) => ({
  key,
  ctrlKey: false,
  metaKey: false,
  altKey: false,
  ...held
});

describe('a key in a chart', () => {
  it('goes on from the chosen reading, and stays within the ends', () => {
    const walk = (key: string, chosen: number) => walkedTo(press(key), picture(5), chosen);
    expect(walk('ArrowRight', -1)).toBe(0);
    expect(walk('ArrowLeft', -1)).toBe(4);
    expect(walk('ArrowRight', 4)).toBe(4);
    expect(walk('ArrowLeft', 0)).toBe(0);
    expect(walk('Home', 3)).toBe(0);
    expect(walk('End', -1)).toBe(4);
    expect(walk('PageUp', 1)).toBe(4);
  });
  it('ends the reading by Escape, once, and leaves other keys to the page', () => {
    expect(walkedTo(press('Escape'), picture(5), 2)).toBe(-1);
    expect(walkedTo(press('Escape'), picture(5), -1)).toBeNull();
    expect(walkedTo(press('a'), picture(5), 2)).toBeNull();
    expect(walkedTo(press('ArrowRight', { altKey: true }), picture(5), 2)).toBeNull();
  });
});

describe('readings in markup', () => {
  it('hold place and words of each', () => {
    expect(JSON.parse(writtenReadings(picture(2))!)).toEqual({
      order: 'across',
      readings: [
        [0.1, 2, 'Count 0: "<" 10⁻³'],
        [1.1, 2, 'Count 1: "<" 10⁻³']
      ]
    });
  });
  it('are left out where they would make the page long', () => {
    expect(writtenReadings(picture(301))).toBeUndefined();
  });
});

describe('the script inside the page', () => {
  it('stands alone, is small, and can stand in a script element', () => {
    expect(script).not.toMatch(/\bimport\b|\brequire\(/);
    expect(script).not.toMatch(/<\/script|<!--/);
    expect(script.length).toBeGreaterThan(500);
    expect(script.length).toBeLessThan(5000);
  });
});
