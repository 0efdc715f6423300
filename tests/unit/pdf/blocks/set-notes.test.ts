import type { MarginNote, Part } from '$lib/pdf/blocks/blocks';
import { writeParts } from '$lib/pdf/write-parts';
import { serverFonts } from '$lib/server/pdf/fonts';
import { describe, expect, it } from 'vitest';
import { readPdf } from '../read-pdf';

/** A page of the margin has some 68 lines of at most nine such words. */
const words = (from: number, count: number) =>
  Array.from({ length: count }, (_, i) => `w${from + i}`).join(' ');

async function noted(notes: MarginNote[]) {
  const part: Part = { title: 'A part', rows: [{ blocks: [{ kind: 'paragraph', text: 'Main.' }], notes }] };
  const answer: Part = { title: 'The answer', rows: [{ blocks: [{ kind: 'paragraph', text: 'Answer.' }] }] };
  const parts = { info: {}, answer, parts: [part, { ...answer, title: 'After' }], foot: 'Foot.', said: '' };
  return readPdf(await writeParts(parts, serverFonts, { compress: false }));
}

describe('notes in the margin', () => {
  it.each([
    ['a paragraph', (count: number): MarginNote => ({ title: 'Long', paragraphs: [words(0, count)] })],
    ['an entry of a list', (count: number): MarginNote => ({ title: 'Long', items: [words(0, count)] })],
    [
      'many paragraphs and entries',
      (count: number): MarginNote => ({
        title: 'Long',
        paragraphs: Array.from({ length: count / 20 }, (_, i) => words(10 * i, 10)),
        items: Array.from({ length: count / 20 }, (_, i) => words(count / 2 + 10 * i, 10))
      })
    ]
  ])('that are higher than a page go on over the next, every word once: %s', async (_, make) => {
    const count = 3000;
    const { text, pages, unmarked, marked } = await noted([
      make(count),
      { title: 'Short', paragraphs: ['End.'] }
    ]);
    expect(pages).toBeGreaterThan(4);
    expect(text.match(/\bw\d+\b/g)).toEqual(words(0, count).split(' '));
    expect(text).toMatch(/Long .* Short End\./);
    expect(unmarked).toEqual([]);
    // No page is drawn over its foot: a line of a note has some words, a page less than 70 lines.
    const most = Math.max(
      ...Array.from({ length: pages }, (_, page) =>
        marked
          .filter((one) => one.page === page)
          .reduce((sum, one) => sum + (one.text.match(/w\d+/g)?.length ?? 0), 0)
      )
    );
    expect(most).toBeLessThan(70 * 9);
  });

  it('stand on one page where they fit', async () => {
    const { pages, marked } = await noted([
      { title: 'Short', paragraphs: ['One.'], items: ['Two.', 'Three.'] }
    ]);
    expect(pages).toBe(2);
    const ofNote = marked.filter(({ text }) => /One|Two|Three|–/.test(text));
    expect(ofNote.map(({ tag }) => tag)).toEqual(['P', 'Lbl', 'LBody', 'Lbl', 'LBody']);
  });
});
