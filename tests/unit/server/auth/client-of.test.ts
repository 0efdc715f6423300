import { clientOf, networkOf } from '$lib/server/auth/client-of';
import { describe, expect, it } from 'vitest';

describe('networkOf', () => {
  it.each([
    ['192.0.2.7', '192.0.2.7'],
    ['::ffff:192.0.2.7', '192.0.2.7'],
    ['::1', '0:0:0:0::/64'],
    ['2001:db8::1', '2001:db8:0:0::/64'],
    ['2001:0DB8:0000:0001:abcd::', '2001:db8:0:1::/64'],
    ['2001:db8:0:1:ffff:ffff:ffff:ffff', '2001:db8:0:1::/64'],
    ['2001:db8:0:1::2', '2001:db8:0:1::/64'],
    ['fe80::1%eth0', 'fe80:0:0:0::/64']
  ])('%s is of %s', (address, network) => expect(networkOf(address)).toBe(network));
});

describe('clientOf', () => {
  it('counts all who come past the proxy as one', () => {
    const getClientAddress = () => {
      throw new Error('Address header was specified but is absent');
    };
    expect(clientOf({ getClientAddress })).toBe('unknown');
  });
});
