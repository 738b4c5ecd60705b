import { createCipheriv, createDecipheriv, hkdfSync, randomBytes } from 'node:crypto';

/** A key of its own for this use, worked out from the program's secret (RFC 5869). */
function keyFrom(sessionSecret: string): Buffer {
  return Buffer.from(hkdfSync('sha256', sessionSecret, '', 'tierwell second factor', 32));
}

/** Encrypts a second factor's secret for its row; AES-256-GCM, bound to the account. */
export function sealSecret(sessionSecret: string, userId: string, secret: string): string {
  const nonce = randomBytes(12);
  const cipher = createCipheriv('aes-256-gcm', keyFrom(sessionSecret), nonce);
  cipher.setAAD(Buffer.from(userId));
  const sealed = Buffer.concat([cipher.update(secret, 'utf8'), cipher.final()]);
  return Buffer.concat([nonce, cipher.getAuthTag(), sealed]).toString('base64url');
}

/** The secret again; throws where the row was changed or is another account's. */
export function openSecret(sessionSecret: string, userId: string, kept: string): string {
  const bytes = Buffer.from(kept, 'base64url');
  const decipher = createDecipheriv('aes-256-gcm', keyFrom(sessionSecret), bytes.subarray(0, 12));
  decipher.setAAD(Buffer.from(userId));
  decipher.setAuthTag(bytes.subarray(12, 28));
  return Buffer.concat([decipher.update(bytes.subarray(28)), decipher.final()]).toString('utf8');
}
