import { createHash, createHmac, randomBytes } from 'node:crypto';

/** Crockford's base 32: no I, L, O or U, so that a code survives being read aloud. */
const base32 = '0123456789ABCDEFGHJKMNPQRSTVWXYZ';

/**
 * A UUID of version 7 (RFC 9562): the time in milliseconds first, so that new rows lie together
 * in an index, then 74 random bits.
 */
export function newId(): string {
  const bytes = randomBytes(16);
  bytes.writeUIntBE(Date.now(), 0, 6);
  bytes.writeUInt8((bytes.readUInt8(6) & 0x0f) | 0x70, 6);
  bytes.writeUInt8((bytes.readUInt8(8) & 0x3f) | 0x80, 8);
  const hex = bytes.toString('hex');
  return [
    hex.slice(0, 8),
    hex.slice(8, 12),
    hex.slice(12, 16),
    hex.slice(16, 20),
    hex.slice(20),
  ].join('-');
}

/** Ten characters, 50 random bits: names an order in addresses and grants nothing. */
export function newOrderCode(): string {
  return codeOf(10);
}

/** Sixteen characters, 80 random bits: opens the page about one cake and nothing else. */
export function newCareCode(): string {
  return codeOf(16);
}

function codeOf(length: number): string {
  return Array.from(randomBytes(length), (byte) => base32.charAt(byte & 31)).join('');
}

/** A secret of 128 bits for a link or a claim. Only its hash is stored. */
export function newKey(): string {
  return randomBytes(16).toString('base64url');
}

/**
 * A secret of 128 bits that can be worked out again from the row it belongs to, so that a mail
 * rendered later can carry a link whose key no table holds.
 */
export function deriveKey(secret: string, purpose: string, subject: string): string {
  return createHmac('sha256', secret)
    .update(JSON.stringify([purpose, subject]))
    .digest()
    .subarray(0, 16)
    .toString('base64url');
}

/** What is stored of a key or token: SHA-256, hexadecimal. */
export function hashKey(key: string): string {
  return createHash('sha256').update(key).digest('hex');
}
