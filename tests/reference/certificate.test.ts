import { readFileSync } from 'node:fs';
import { certificate, type CertificateInput } from '$lib/stats/bounds/certificate';
import { describe, expect, it } from 'vitest';

/** Made by fixtures/reference/certificate.py with 40 digits (mpmath), threshold by threshold. */
const { cases } = JSON.parse(
  readFileSync(new URL('../../fixtures/reference/certificate.json', import.meta.url), 'utf8')
) as {
  cases: {
    name: string;
    input: CertificateInput;
    certificate: Record<'p' | 'side' | 'bound' | 'mean', string> &
      Record<'count' | 'thresholds' | 'shots', number>;
  }[];
};

const relativeError = (got: number | undefined, want: string) => Math.abs((got ?? NaN) / Number(want) - 1);

describe('certificate against 40 digits', () => {
  it.each(cases.map((one) => [one.name, one] as const))('%s', (_, { input, certificate: want }) => {
    const got = certificate(input);
    expect(got).toMatchObject({
      side: want.side,
      count: want.count,
      thresholds: want.thresholds,
      shots: want.shots
    });
    expect(relativeError(got?.p, want.p)).toBeLessThan(1e-9);
    expect(relativeError(got?.bound, want.bound)).toBeLessThan(1e-10);
    expect(relativeError(got?.mean, want.mean)).toBeLessThan(1e-12);
  });
});
