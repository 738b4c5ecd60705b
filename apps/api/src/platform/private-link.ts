import { deriveKey } from './ids.ts';

export type LinkedOrder = { readonly id: string; readonly keyRenewedAt: Date | null };

/** What a browser keeps of a private link it has opened: the order, and which link it was. */
export type OrderGrant = { readonly id: string; readonly renewedAt: string | null };

/** What opening the link as it is now grants; renewing it makes another. */
export function grantOf({ id, keyRenewedAt }: LinkedOrder): OrderGrant {
  return { id, renewedAt: keyRenewedAt?.toISOString() ?? null };
}

/**
 * The key of an order's private link. It is worked out from the order's row, so that a mail
 * rendered later carries the link though only the key's hash is stored; renewing the key moves
 * `keyRenewedAt`, which makes another one and leaves the old link dead.
 */
export function privateKeyOf(sessionSecret: string, order: LinkedOrder): string {
  const renewed = order.keyRenewedAt?.toISOString() ?? '';
  return deriveKey(sessionSecret, 'order-link', `${order.id}:${renewed}`);
}

/**
 * The key answered to the browser that sent the order: it opens the order like the link does, but
 * does not show that the e-mail arrived, so it keeps no place longer.
 */
export function senderKeyOf(sessionSecret: string, order: LinkedOrder): string {
  return privateKeyOf(deriveKey(sessionSecret, 'order-sender', ''), order);
}

/** Where an order's private link leads; the key is in the fragment, which browsers keep. */
export function privateLink(publicUrl: string, code: string, key: string): string {
  return `${publicUrl}/orders/${code}#key=${key}`;
}
