import { createHash } from 'node:crypto';

/** Name space of the demo school's ids; any fixed id would do. */
const NAMESPACE = Buffer.from('6f0c2a9e6b1d4c539d0e3f5b7a418c26', 'hex');

/** The same id for the same names on every run: a UUID of version 5 (RFC 9562, section 5.5). */
export function idFor(...names: (string | number)[]): string {
  const bytes = createHash('sha1').update(NAMESPACE).update(names.join('/')).digest().subarray(0, 16);
  bytes[6] = ((bytes[6] ?? 0) & 0x0f) | 0x50;
  bytes[8] = ((bytes[8] ?? 0) & 0x3f) | 0x80;
  const hex = bytes.toString('hex');
  return [hex.slice(0, 8), hex.slice(8, 12), hex.slice(12, 16), hex.slice(16, 20), hex.slice(20)].join('-');
}
