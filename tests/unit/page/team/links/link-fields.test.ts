import { linkOptionsSchema } from '$lib/model/link/link-options';
import { freshFields, readFields } from '$lib/page/team/links/link-fields';
import { sayLink } from '$lib/page/team/links/say-link';
import { describe, expect, it } from 'vitest';

const read = (more: Partial<ReturnType<typeof freshFields>>) =>
  linkOptionsSchema.safeParse(readFields({ ...freshFields(), label: 'referee 2', ...more }));

const problems = (more: Partial<ReturnType<typeof freshFields>>) =>
  read(more).error?.issues.map(({ path }) => path.join('.')) ?? [];

describe('the form of a new link', () => {
  it('reads addresses as people paste them, once each and in lower case', () => {
    const found = read({
      audience: 'named',
      people: ' Ada@Example.org;\nbo@example.org, ada@example.org\n\n'
    });
    expect(found.data?.people).toEqual(['ada@example.org', 'bo@example.org']);
  });

  it('keeps no address where nobody is named', () => {
    expect(read({ audience: 'anyone', people: 'ada@example.org' }).data?.people).toEqual([]);
  });

  it('is open to the end of the day it names', () => {
    expect(read({ until: '2031-02-03' }).data?.expiresAt).toBe(Date.UTC(2031, 1, 4));
    expect(read({}).data?.expiresAt).toBeNull();
  });

  it('names what does not fit', () => {
    expect(problems({ label: '  ' })).toEqual(['label']);
    expect(problems({ audience: 'named' })).toEqual(['people']);
    expect(problems({ audience: 'named', people: 'ada@example.org\nno address' })).toEqual(['people.1']);
    expect(problems({ visits: 'some' })).toEqual(['visitLimit']);
    expect(problems({ visits: '0' })).toEqual(['visitLimit']);
    expect(problems({ visits: '1.5' })).toEqual(['visitLimit']);
    expect(problems({ until: 'tomorrow' })).toEqual(['expiresAt']);
    expect(problems({ visits: '3', until: '2031-02-03' })).toEqual([]);
  });

  it('is told in sentences', () => {
    const found = read({
      blind: true,
      visits: '1',
      until: '2031-02-03',
      shows: 'report',
      hidesReferees: true
    });
    expect(sayLink(found.data!)).toEqual([
      'Opens for anyone who has the address.',
      'Shows the report without its counts: whoever guesses them can check the guess, but not recompute the report. Hides team, people, device, firmware and group.',
      'Takes remarks, signed “A referee”.',
      'Open until 3 Feb 2031, end of day UTC, or after 1 visit.'
    ]);
  });
});
