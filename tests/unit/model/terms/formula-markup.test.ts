import { describe, expect, it } from 'vitest';
import { formulaMarkup } from '$lib/model/terms/formula-markup';

describe('formulaMarkup', () => {
  it('writes elements, and slopes nothing by itself', () => {
    expect(formulaMarkup('κ_2 ≤ frac{1}{N}')).toBe(
      '<math display="block"><msub><mi mathvariant="normal">κ</mi><mn>2</mn></msub><mo>≤</mo>' +
        '<mfrac><mn>1</mn><mi mathvariant="normal">N</mi></mfrac></math>'
    );
  });

  it('sets a bar close and gives names their room', () => {
    expect(formulaMarkup('D | "x" ln a')).toContain('<mo lspace="0" rspace="0">|</mo>');
    expect(formulaMarkup('ln a')).toContain('<mi>ln\u2009</mi>');
  });

  it('escapes what markup is made of', () => {
    expect(formulaMarkup('a < b & c > d')).toContain('<mo>&lt;</mo>');
    expect(formulaMarkup('a & "<b>"')).toContain('&lt;b&gt;');
    expect(formulaMarkup('a & b')).toContain('<mo>&amp;</mo>');
  });
});
