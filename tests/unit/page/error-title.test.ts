import { errorTitle } from '$lib/page/error-title';
import { describe, expect, it } from 'vitest';

describe('errorTitle', () => {
  it.each([
    [403, 'Not for your role'],
    [404, 'There is no page here'],
    [409, 'That could not be done'],
    [503, 'Not just now'],
    [500, 'This page could not be made']
  ])('%i: %s', (status, title) => expect(errorTitle(status)).toBe(title));
});
