import { User } from '#api/db/models/user.ts';
import { inTransaction } from '#api/db/transaction.ts';
import type { Deps } from '#api/modules/deps.ts';
import { joinGuestOrders } from './join-guest-orders.command.ts';

/**
 * The customer's account of an address that has just been proven: found, or opened. Somebody whose
 * staff role was ended comes back as a customer. Answers null for staff, who are never signed in
 * by an address.
 */
export async function openAccount(
  { clock }: Pick<Deps, 'clock'>,
  who: { readonly email: string; readonly name: string | null },
): Promise<User | null> {
  return inTransaction(async () => {
    const now = clock.now();
    const found = await User.findOne({ where: { email: who.email } });
    if (found !== null && found.role !== 'customer' && found.endedAt === null) return null;
    const user =
      found ??
      (await User.create({
        email: who.email,
        name: who.name ?? '',
        role: 'customer',
        emailProvenAt: now,
      }));
    await user.update({
      role: 'customer',
      endedAt: null,
      passwordHash: null,
      emailProvenAt: user.emailProvenAt ?? now,
      lastSignedInAt: now,
      name: user.name === '' ? (who.name ?? '') : user.name,
    });
    await joinGuestOrders(user);
    return user;
  });
}
