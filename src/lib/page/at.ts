/** The part of a result that an address opens at, such as `rate` in `#counts=…&at=rate`; null for none. */
export const readAt = (fragment: string): string | null =>
  /(?:^#?|&)at=([a-z-]+)$/.exec(fragment)?.[1] ?? null;

/** The address without the part to open at. */
export const withoutAt = (fragment: string): string =>
  fragment.replace(/^#/, '').replace(/(?:^|&)at=[a-z-]+$/, '');

/** An address that opens at `part`. */
export const withAt = (address: string | null, part: string): string =>
  `${address === null ? '' : `${address}&`}at=${part}`;
