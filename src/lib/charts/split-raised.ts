const SIGNS = '⁰¹²³⁴⁵⁶⁷⁸⁹⁻';
const PLAIN = '0123456789\u2212';

/** A stretch of text, and the raised digits that follow it. */
export interface Stretch {
  text: string;
  raised: string;
}

/**
 * Parts "2.8 × 10⁻⁶ nats" into text and raised digits: few fonts, and not the page's own, draw these signs,
 * so they are set as small ordinary digits instead.
 */
export function splitRaised(text: string): Stretch[] {
  const stretches: Stretch[] = [];
  for (const [whole, plain, raised] of text.matchAll(/([^⁰¹²³⁴⁵⁶⁷⁸⁹⁻]*)([⁰¹²³⁴⁵⁶⁷⁸⁹⁻]*)/g)) {
    if (whole)
      stretches.push({ text: plain, raised: [...raised].map((sign) => PLAIN[SIGNS.indexOf(sign)]).join('') });
  }
  return stretches;
}
