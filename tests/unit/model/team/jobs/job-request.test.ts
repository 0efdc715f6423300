import { readJobQuery, writeJobQuery } from '$lib/model/team/jobs/job-query';
import { jobRequestSchema, MOST_JOBS, requestOfForm } from '$lib/model/team/jobs/job-request';
import { describe, expect, it } from 'vitest';

function form(...fields: [string, string][]): FormData {
  const made = new FormData();
  for (const [name, value] of fields) made.append(name, value);
  return made;
}

describe('a request for jobs', () => {
  it('comes from a form: datasets repeated, empty numbers left out, other fields ignored', () => {
    const given = form(['dataset', 'a'], ['dataset', 'b'], ['seed', '7'], ['alpha', ''], ['other', 'x']);
    const read = jobRequestSchema.parse(requestOfForm(given));
    expect(read).toEqual({ dataset: ['a', 'b'], seed: 7 });
  });

  it('comes from JSON, with one dataset or a list', () => {
    expect(jobRequestSchema.parse({ dataset: 'a' })).toEqual({ dataset: ['a'] });
    expect(jobRequestSchema.parse({ dataset: ['a'], resamples: 99 })).toEqual({
      dataset: ['a'],
      resamples: 99
    });
  });

  it.each([
    [{}, 'dataset'],
    [{ dataset: [] }, 'dataset'],
    [{ dataset: [7] }, 'dataset'],
    [{ dataset: Array.from({ length: MOST_JOBS + 1 }, (_, i) => `d${i}`) }, 'dataset'],
    [{ dataset: ['a'], seed: 'seven' }, 'seed'],
    [{ dataset: ['a'], trials: 12 }, '']
  ])('is refused when it does not fit (%#)', (given, at) => {
    const read = jobRequestSchema.safeParse(given);
    expect(read.error?.issues[0].path[0] ?? '').toBe(at);
    expect(read.success).toBe(false);
  });
});

describe('a query of jobs', () => {
  it('goes into an address and back', () => {
    const query = { show: 'failed', page: 3 } as const;
    expect(readJobQuery(new URLSearchParams(writeJobQuery(query)))).toEqual(query);
    expect(writeJobQuery({ show: 'all', page: 1 })).toBe('');
  });

  it('counts what is not understood as not given', () => {
    expect(readJobQuery(new URLSearchParams('show=x&page=-2'))).toEqual({ show: 'all', page: 1 });
  });
});
