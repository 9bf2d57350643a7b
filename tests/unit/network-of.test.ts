import { expect, test } from 'vitest';
import { networkOf } from '#server/http/network-of.ts';

test.each([
  ['198.51.100.7', '198.51.100.7'],
  ['::ffff:198.51.100.7', '198.51.100.7'],
  ['2001:db8:0:7:1:2:3:4', '2001:db8:0:7::/64'],
  ['2001:db8::7:0:0:0:4', '2001:db8:0:7::/64'],
  ['2001:0DB8:0000:0007::9', '2001:db8:0:7::/64'],
  ['fe80::1%eth0', 'fe80:0:0:0::/64'],
  ['::1', '0:0:0:0::/64'],
  ['', ''],
])('%s counts as %s', (address, network) => {
  expect(networkOf(address)).toBe(network);
});
