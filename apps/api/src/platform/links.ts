import { deriveKey } from './ids.ts';

/** The secret a one-time link carries. It is worked out from its row, so that no table holds it. */
export function keyOfLink(sessionSecret: string, token: { id: string; purpose: string }): string {
  return deriveKey(sessionSecret, token.purpose, token.id);
}

/** Where a one-time link leads: the key is in the fragment, which browsers send to nobody. */
export function linkAddress(publicUrl: string, purpose: string, key: string): string {
  const page = purpose === 'confirm-action' ? 'confirm' : purpose;
  return `${publicUrl}/links/${page}#${key}`;
}
