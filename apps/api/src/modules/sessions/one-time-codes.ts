import { randomBytes } from 'node:crypto';
import { Secret, TOTP } from 'otpauth';

/** Seconds a code lasts (RFC 6238, section 5.2). */
const periodS = 30;

function totp(secret: string, account: string, issuer: string): TOTP {
  return new TOTP({
    issuer,
    label: account,
    secret: Secret.fromBase32(secret),
    period: periodS,
    digits: 6,
  });
}

/** 160 random bits in base 32, the length RFC 4226 asks for. */
export function newTotpSecret(): string {
  return new Secret({ size: 20 }).base32;
}

/** The address an authenticator application reads from the picture. */
export function totpUri(secret: string, account: string, issuer: string): string {
  return totp(secret, account, issuer).toString();
}

/**
 * The time step whose code this is, one to either side of now allowed, or null. The caller
 * remembers it: a step is good once.
 */
export function matchingStep(secret: string, code: string, now: Date): number | null {
  const timestamp = now.getTime();
  const delta = totp(secret, '', '').validate({ token: code, timestamp, window: 1 });
  return delta === null ? null : Math.floor(timestamp / 1000 / periodS) + delta;
}

const alphabet = '0123456789abcdefghjkmnpqrstvwxyz';

function inGroups(letters: string): string {
  return (letters.match(/.{1,4}/g) ?? []).join('-');
}

/** Ten codes of 80 random bits, in groups to write down. */
export function newRecoveryCodes(): string[] {
  return Array.from({ length: 10 }, () =>
    inGroups(Array.from(randomBytes(16), (byte) => alphabet.charAt(byte & 31)).join('')),
  );
}

/** A recovery code as it was made, however it was typed: the letters o, i and l are figures. */
export function readRecoveryCode(typed: string): string {
  const letters = typed.toLowerCase().replaceAll('o', '0').replaceAll(/[il]/g, '1');
  return inGroups(letters.replaceAll(/[^0-9a-z]/g, ''));
}
