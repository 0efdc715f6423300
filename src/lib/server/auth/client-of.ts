import type { RequestEvent } from '@sveltejs/kit';

/**
 * Where a request comes from, for counting attempts. The adapter gives the peer's own address, or what the proxy wrote
 * into ADDRESS_HEADER where that is set; a header that anybody may write is never believed otherwise.
 */
export function clientOf(event: Pick<RequestEvent, 'getClientAddress'>): string {
  try {
    return networkOf(event.getClientAddress());
  } catch {
    // ADDRESS_HEADER is set and the request came past the proxy: all of those count as one.
    return 'unknown';
  }
}

/** An IPv4 address as it is; of an IPv6 address the first 64 bits, as one household has all the others. */
export function networkOf(address: string): string {
  const mapped = /^::ffff:(\d+\.\d+\.\d+\.\d+)$/i.exec(address);
  if (mapped) return mapped[1];
  if (!address.includes(':')) return address;
  const [head, tail] = address.toLowerCase().split('%')[0].split('::');
  const before = head ? head.split(':') : [];
  const after = tail ? tail.split(':') : [];
  const zeros =
    tail === undefined ? [] : Array<string>(Math.max(0, 8 - before.length - after.length)).fill('0');
  const groups = [...before, ...zeros, ...after].slice(0, 4);
  return `${groups.map((group) => group.replace(/^0+(?=.)/, '')).join(':')}::/64`;
}
