import { sayShare } from '$lib/model/say-share';
import { expect, it } from 'vitest';

it.each([
  [0.1, '10'],
  [0.05, '5'],
  [0.07, '7'],
  [0.125, '12.5'],
  [0.0001, '0.01'],
  [0, '0']
])('says the share %d as it was chosen, without zeros that nobody gave', (share, said) => {
  expect(sayShare(share)).toBe(`${said}\u202f%`);
});
