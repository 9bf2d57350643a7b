import { isIPv6 } from 'node:net';

/** Groups of an IPv6 address, "::" filled in. */
function groups(address: string): string[] {
  const [head = '', tail] = address.split('::');
  const before = head.split(':').filter(Boolean);
  const after = (tail ?? '').split(':').filter(Boolean);
  const missing = tail === undefined ? 0 : Math.max(0, 8 - before.length - after.length);
  return [...before, ...Array.from({ length: missing }, () => '0'), ...after];
}

/**
 * Who an address stands for when failures are counted: an IPv4 address itself, an IPv6 address its /64, since one
 * household holds all of those.
 */
export function networkOf(address: string): string {
  const mapped = /^::ffff:(\d+\.\d+\.\d+\.\d+)$/i.exec(address);
  if (mapped?.[1]) return mapped[1];
  const bare = address.replace(/%.*$/, '');
  if (!isIPv6(bare)) return address;
  const prefix = groups(bare)
    .slice(0, 4)
    .map((group) => Number.parseInt(group, 16).toString(16));
  return `${prefix.join(':')}::/64`;
}
