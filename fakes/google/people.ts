import { createHash } from 'node:crypto';

/** An invented Google account. `sub` is what an application keeps: it never changes. */
export interface Person {
  sub: string;
  givenName: string;
  familyName: string;
  email: string;
}

/** A stable number of 21 digits for an address, as long as the real identifiers are. */
function subOf(email: string): string {
  const digest = createHash('sha256').update(email.toLowerCase()).digest('hex');
  return `1${(BigInt(`0x${digest}`) % 10n ** 20n).toString().padStart(20, '0')}`;
}

/** The account of any address: the invented person it belongs to, or a new one with that name. */
export function personFor(email: string, name = ''): Person {
  const known = people.find((person) => person.email === email.toLowerCase());
  if (known !== undefined) return known;
  const [givenName = '', ...rest] = name.trim().split(/\s+/);
  return {
    sub: subOf(email),
    givenName: givenName === '' ? (email.split('@')[0] ?? email) : givenName,
    familyName: rest.join(' '),
    email,
  };
}

/** Who the account chooser offers: four customers, and the studio's owner for the staff's side. */
export const people: readonly Person[] = [
  ['Rosa', 'Whitlock', 'rosa.whitlock@example.com'],
  ['Tomas', 'Adair', 'tomas.adair@example.com'],
  ['Priya', 'Venkat', 'priya.venkat@example.com'],
  ['Ines', 'Castellan', 'ines.castellan@example.com'],
  ['Ida', 'Thorne', 'ida@oxbowlane.example'],
].map(([givenName = '', familyName = '', email = '']) => ({
  sub: subOf(email),
  givenName,
  familyName,
  email,
}));
