import { GUIDE_CASES } from '$lib/stats/demo/guide-cases';
import { readdirSync, readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { guideDocument } from '../../../../src/cli/demo/guide-document';

describe('the documents of the guide', () => {
  it.each(GUIDE_CASES.map((demo) => [demo.slug, demo] as const))(
    '%s is what the engine gives today, byte for byte (`npm run demo` writes it anew)',
    async (slug, demo) => {
      const committed = readFileSync(`fixtures/guide/${slug}.json`, 'utf8');
      expect((await guideDocument(demo)) === committed).toBe(true);
      expect(committed.length).toBeLessThan(80_000);
    }
  );

  it('are all there, and no others', () => {
    expect(readdirSync('fixtures/guide').sort()).toEqual(
      GUIDE_CASES.map(({ slug }) => `${slug}.json`).sort()
    );
  });

  // The guide's words lean on these outcomes; an engine that changes one of them changes the lesson.
  it.each([
    ['bunched-sites', 'ruled-out', ['bunching']],
    ['hard-core-gas', 'compatible', ['regular']],
    ['misread-kinks', 'ruled-out', ['bunching', 'misreads']],
    ['forty-shots', 'undecided', []]
  ])('%s is %s', (slug, verdict, flags) => {
    const { answer, flags: raised, tails } = JSON.parse(readFileSync(`fixtures/guide/${slug}.json`, 'utf8'));
    expect(answer.verdict).toBe(verdict);
    expect(raised.map(({ id }: { id: string }) => id)).toEqual(expect.arrayContaining(flags));
    if (slug === 'bunched-sites') expect(tails.certificate.p).toBeLessThan(0.01);
  });
});
