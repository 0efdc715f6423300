import type { Certificate } from '../types';
import type { AtRate, BareTest } from './at-rate';

/**
 * p of every test against independent kinks read at any rate of an interval that holds the true one but for the chance
 * β: the largest p over the rates, plus β. A test that cannot run at one of the rates cannot speak against that rate; one
 * that was not asked there is left as it is.
 *
 * @param stated tests at the rate stated, whose statistics are kept
 * Source: Berger & Boos 1994, J. Am. Stat. Assoc. 89:1012 (m).
 */
export function worstTests(stated: BareTest[], rates: AtRate[], miss: number): BareTest[] {
  return stated.map((test) => {
    let worst: BareTest = test;
    for (const { tests, only } of rates) {
      if (only && !only.includes(test.id)) continue;
      const there = tests.find(({ id }) => id === test.id);
      if (!there) return { ...test, p: 1, smallestP: test.smallestP + miss };
      if (there.p > worst.p) worst = there;
    }
    return {
      ...test,
      p: Math.min(1, worst.p + miss),
      smallestP: worst.smallestP + miss,
      resamples: worst.resamples,
      stoppedEarly: worst.stoppedEarly
    };
  });
}

/** The same of the certificate: none where one rate has none. */
export function worstCertificate(all: (Certificate | null)[], miss: number): Certificate | null {
  const found = all.filter((one) => one !== null);
  if (found.length < all.length || found.length === 0) return null;
  const worst = found.reduce((a, b) => (b.p > a.p ? b : a));
  return { ...worst, p: Math.min(1, worst.p + miss) };
}
