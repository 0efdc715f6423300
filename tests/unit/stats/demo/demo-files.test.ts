import { readdirSync, readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { DEMO_FILES } from '$lib/stats/demo/demo-files';
import { writeDemo } from '$lib/stats/demo/write-demo';

describe('the demo files', () => {
  it.each(DEMO_FILES.map((demo) => [demo.slug, demo] as const))(
    '%s is what the generator writes',
    (slug, demo) => {
      const committed = readFileSync(`fixtures/demo/${slug}.csv`, 'utf8');
      expect(committed === writeDemo(demo)).toBe(true);
      expect(committed.split('\n')[0]).toContain(`Invented data, seed ${demo.seed}.`);
    }
  );

  it('are all there, and no others', () => {
    expect(readdirSync('fixtures/demo').sort()).toEqual(DEMO_FILES.map(({ slug }) => `${slug}.csv`).sort());
  });

  it('use a seed each', () => {
    expect(new Set(DEMO_FILES.map(({ seed }) => seed)).size).toBe(DEMO_FILES.length);
  });

  it('stay small: histograms under 2 kB, the shot list under 40 kB', () => {
    for (const demo of DEMO_FILES) {
      expect(writeDemo(demo).length, demo.slug).toBeLessThan(demo.slug === 'drifting-shots' ? 40_000 : 2000);
    }
  });
});
