import { sayUntil } from '$lib/model/say-until';
import { describe, expect, it } from 'vitest';

describe('how long something stays open', () => {
  it('names the last day, not the midnight after it', () => {
    expect(sayUntil(Date.UTC(2027, 0, 2))).toBe('until 1 Jan 2027, end of day UTC');
    expect(sayUntil(Date.UTC(2028, 2, 1))).toBe('until 29 Feb 2028, end of day UTC');
  });

  it('names the time where it does not end with a day', () => {
    expect(sayUntil(Date.UTC(2027, 0, 1, 14, 30))).toBe('until 1 Jan 2027, 14:30 UTC');
  });
});
