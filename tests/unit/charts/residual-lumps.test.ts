import { distributionPicture } from '$lib/charts/distribution-picture';
import { expect, it } from 'vitest';
import { CASES } from './cases';

/** Where the dots and wedges of one role are drawn: the first point of each piece of the path. */
const places = (d: string): [number, number][] =>
  [...d.matchAll(/M\s*([-\d.]+)[ ,]([-\d.]+)/g)].map(([, x, y]) => [Number(x), Number(y)]);

it('rows that lump counts have their distance from the law in the strip, though single counts are gathered', async () => {
  const make = CASES.find(([name]) => name === 'lumps at both ends of 500 counts')![1];
  const diagnosis = await make();
  const lumps = diagnosis.distribution.filter(({ lump }) => lump);
  expect(lumps).toHaveLength(2);
  const picture = distributionPicture(diagnosis, { width: 640, text: 13 });
  expect(picture.notes.join()).toMatch(/Too many counts/);
  const opening = picture.readings[0].x;
  const closing = picture.readings[picture.readings.length - 1].x;
  // The strip is 104 high and stands above the axis of counts, 3.8 lines of writing from the lower end.
  const top = picture.height - 3.8 * 13 - 104;
  const inStrip = picture.marks.flatMap((mark) =>
    mark.kind === 'path' && mark.role.startsWith('observed') ? places(mark.d).filter(([, y]) => y > top) : []
  );
  for (const middle of [opening, closing])
    expect(
      inStrip.some(([x]) => Math.abs(x - middle) < 0.1),
      `${middle}`
    ).toBe(true);
});
