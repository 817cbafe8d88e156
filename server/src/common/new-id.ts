import { randomBytes } from 'node:crypto';

/**
 * A UUIDv7 (RFC 9562, 5.7): 48 bits of Unix milliseconds, then random bits, so that rows made one after another lie
 * together in the index. E.g. `0192f0c1-7a3b-7xxx-8xxx-xxxxxxxxxxxx`.
 */
export function newId(): string {
  const bytes = randomBytes(16);
  bytes.writeUIntBE(Date.now(), 0, 6);
  bytes[6] = ((bytes[6] ?? 0) & 0x0f) | 0x70;
  bytes[8] = ((bytes[8] ?? 0) & 0x3f) | 0x80;
  const hex = bytes.toString('hex');
  return [
    hex.slice(0, 8),
    hex.slice(8, 12),
    hex.slice(12, 16),
    hex.slice(16, 20),
    hex.slice(20),
  ].join('-');
}
