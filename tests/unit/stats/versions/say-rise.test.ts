import { sayRise } from '$lib/stats/versions/say-rise';
import { describe, expect, it } from 'vitest';

describe('sayRise', () => {
  it.each([
    [0.0978, 0.1, '9.78'],
    [0.1029, 0.1, '10.3'],
    // 10.0 would say that they are the same.
    [0.10003, 0.1, '10.003'],
    [0.09998, 0.1, '9.998'],
    [0.1, 0.1, '10.0']
  ])('says %d beside %d with digits enough not to contradict it', (rise, tolerance, said) => {
    expect(sayRise(rise, tolerance)).toBe(`${said}\u202f%`);
  });
});
