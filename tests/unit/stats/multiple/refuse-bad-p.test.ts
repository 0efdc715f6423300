import { refuseBadP } from '$lib/stats/multiple/refuse-bad-p';
import { describe, expect, it } from 'vitest';

describe('refuseBadP', () => {
  it('lets probabilities through, ends included, and names what is none', () => {
    expect(() => refuseBadP([0, 0.3, 1])).not.toThrow();
    expect(() => refuseBadP([0.2, NaN])).toThrow('p-value 1 is NaN');
  });
});
