import { liveMarkup, plainMarkup } from '$lib/page/kept/plain-markup';
import { describe, expect, it } from 'vitest';

describe('markup of a page that stands as drawn', () => {
  it('has no marks but in parts that are made live', () => {
    const live = liveMarkup('<!--[--><p>live</p><!--[-1--><!--]--><!---->');
    expect(plainMarkup(`<!--[0--><h1>A<!----></h1><div>${live}</div><!--]-->`)).toBe(
      '<h1>A</h1><div><!--[--><p>live</p><!--[-1--><!--]--><!----></div>'
    );
  });

  it('keeps parts within parts as they were drawn', () => {
    const inner = liveMarkup('<!--[--><i>in</i><!--]-->');
    expect(plainMarkup(liveMarkup(`<!--[--><b>${inner}</b><!--]-->`))).toBe(
      '<!--[--><b><!--[--><i>in</i><!--]--></b><!--]-->'
    );
  });

  it('leaves escaped words alone that look like marks', () => {
    const words = '<p title="&lt;!--[-->">&lt;!----> and &lt;!~</p>';
    expect(plainMarkup(liveMarkup(words))).toBe(words);
    expect(plainMarkup(words)).toBe(words);
  });
});
