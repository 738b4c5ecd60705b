import { hash, verify } from '@node-rs/argon2';

/**
 * Argon2id with 19 MiB, two passes and one lane: the first of the equal choices in OWASP's
 * Password Storage Cheat Sheet. The parameters are kept with each hash, so they may grow.
 */
const cost = { memoryCost: 19_456, timeCost: 2, parallelism: 1 } as const;

/** A hash of a password nobody has; checked against where there is no account, to take as long. */
const nobodys =
  '$argon2id$v=19$m=19456,t=2,p=1$t1Dt+Y8NHGnPgapNFxm3Cw$///Zje8WnCNB7uZzrDewjxWErQEfJbKmCEkqDndI9g4';

/** The form a password is compared in (NIST SP 800-63B-4, section 3.1.1.2: normalised Unicode). */
function normalised(password: string): string {
  return password.normalize('NFKC');
}

export async function hashPassword(password: string): Promise<string> {
  return hash(normalised(password), cost);
}

/** Whether it is the password; takes as long where there is none to compare with. */
export async function passwordMatches(kept: string | null, password: string): Promise<boolean> {
  const matches = await verify(kept ?? nobodys, normalised(password));
  return kept !== null && matches;
}
