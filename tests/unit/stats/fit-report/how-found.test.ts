import type { BestLaw } from '$lib/stats/fit/best-law';
import { howFound } from '$lib/stats/fit-report/how-found';
import { describe, expect, it } from 'vitest';
import { levelsOf } from '../fit/plain';

const best: BestLaw = { levels: levelsOf([[0.3, 12]]), logLikelihood: -100, starts: 6, agreeing: 4 };

describe('howFound', () => {
  it('certifies a law that is within 0.01 nats, in all, of the floor', () => {
    expect(howFound(best, 0.001, 0.001, 1000).certified).toBe(true);
    expect(howFound(best, 0.001, 0.001 - 9e-6, 1000).certified).toBe(true);
    expect(howFound(best, 0.001, 0.001 - 11e-6, 1000).certified).toBe(false);
    // The same distance a shot is no proof with a million of them.
    expect(howFound(best, 0.001, 0.001 - 9e-6, 1e6).certified).toBe(false);
  });

  it('says how many starts agreed, and how far off the floor is', () => {
    const { how } = howFound(best, 0.003, 0.001, 1000);
    expect(how).toContain('From 6 starts, 4 of which ended within 0.01 nats');
    expect(how).toContain('0.0020 nats a shot lower');
    expect(how).not.toMatch(/prove/i);
    expect(howFound({ ...best, starts: 1, agreeing: 1 }, 0, 0, 10).how).toContain('the only start');
  });
});
