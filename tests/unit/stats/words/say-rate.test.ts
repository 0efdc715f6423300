import { sayRate } from '$lib/stats/words/say-rate';
import { expect, it } from 'vitest';

it.each([
  [0.01, '1.0 %'],
  [0.499, '49.9 %'],
  [0.4999, '49.99 %'],
  [0.4999999, 'just under 50 %'],
  [0.0125, '1.25 %'],
  [0.012345678, '1.235 %'],
  [0.0005, '0.050 %'],
  [0.3, '30 %'],
  [0, '0 %']
])('%s is %s', (rate, text) => expect(sayRate(rate).replaceAll('\u202f', ' ')).toBe(text));
