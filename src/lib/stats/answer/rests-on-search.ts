import type { Evidence } from '../flags/evidence';
import type { TestResult } from '../types';

/** Tests that are made without the best law found. */
const without = new Set<TestResult['id']>(['ceiling', 'batches', 'order']);

/**
 * Whether independent trials would be ruled out by nothing but the best law found, where that law may not be the best:
 * with misread sites the order of the bonds matters, not every order is searched (see chainFit), and bonds that are sure
 * or excluded in an order of their own can look like a misfit. They lie below the ceiling, so data that are not surely
 * below it are free of that doubt: there only equal bonds are left.
 */
export function restsOnSearch({
  certificate,
  tests,
  options,
  misread,
  moments
}: Pick<Evidence, 'certificate' | 'tests' | 'options' | 'misread'> & {
  moments: Pick<Evidence['moments'], 'dispersion'>;
}): boolean {
  if (!misread?.applies || (certificate && certificate.p <= options.alpha)) return false;
  const { high } = moments.dispersion;
  const against = tests.filter((test) => test.pAdjusted <= options.alpha);
  return high !== null && high < 1 && against.length > 0 && against.every(({ id }) => !without.has(id));
}
