import { BlockList, isIPv6 } from 'node:net';

/**
 * Networks that a webhook may not reach: the server stands inside them, and whoever makes a webhook may not. From the
 * registries of special-purpose addresses of RFC 6890 and its successors, with multicast.
 */
const INNER: [string, number][] = [
  ['0.0.0.0', 8],
  ['10.0.0.0', 8],
  ['100.64.0.0', 10],
  ['127.0.0.0', 8],
  ['169.254.0.0', 16],
  ['172.16.0.0', 12],
  ['192.0.0.0', 24],
  ['192.168.0.0', 16],
  ['198.18.0.0', 15],
  ['224.0.0.0', 3],
  ['::', 127],
  ['64:ff9b::', 96],
  ['64:ff9b:1::', 48],
  ['100::', 64],
  ['2002::', 16],
  ['fc00::', 7],
  ['fe80::', 9],
  ['ff00::', 8]
];

const inner = new BlockList();
for (const [network, bits] of INNER) inner.addSubnet(network, bits, isIPv6(network) ? 'ipv6' : 'ipv4');

/** Whether an IP address lies inside: loopback, private, link-local, multicast, or IPv4 written within IPv6 that does. */
export function isInnerAddress(address: string): boolean {
  // Node's list looks through ::ffff:a.b.c.d by itself; translated and 6to4 addresses are refused as a whole.
  return inner.check(address, isIPv6(address) ? 'ipv6' : 'ipv4');
}
