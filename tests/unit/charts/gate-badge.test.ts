import { gateBadge, type Standing } from '$lib/charts/gate-badge';
import { describe, expect, it } from 'vitest';

const attribute = (svg: string, name: string) =>
  Number(new RegExp(`^<svg[^>]* ${name}="([\\d.]+)"`).exec(svg)?.[1]);

describe('gateBadge', () => {
  it.each<[Standing, string, RegExp]>([
    ['passed', 'passed', /<circle/],
    ['failed', 'failed', /M6 1L11\.5 11/],
    ['undecided', 'undecided', /M6 1L11 6/],
    ['no-rule', 'no gate', /M2 6H10/]
  ])('says %s by word and shape', (standing, word, shape) => {
    const svg = gateBadge('ebb 3.1', standing);
    expect(svg).toContain(`<title>Gate of ebb 3.1: ${word}</title>`);
    expect(svg).toMatch(shape);
    expect(svg).not.toMatch(/style=|<script|href/);
  });

  it('writes names as text, whatever they hold', () => {
    const svg = gateBadge('</text><script>"&\u0000\ud800', 'passed');
    expect(svg).not.toContain('<script');
    expect(svg).toContain('&lt;/text&gt;&lt;script&gt;&quot;&amp;');
    expect(svg).not.toMatch(/[\u0000\ud800]/u);
  });

  it('is as wide as its words, and cuts very long names', () => {
    const [short, long, longer] = ['a', 'a'.repeat(40), 'a'.repeat(400)].map((name) =>
      gateBadge(name, 'failed')
    );
    expect(attribute(long, 'width') - attribute(short, 'width')).toBeCloseTo(39 * 7.2, 6);
    expect(attribute(longer, 'width')).toBe(attribute(long, 'width'));
    expect(longer).toContain('a…');
  });
});
