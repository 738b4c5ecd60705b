import { Studio } from '#api/db/models/studio.ts';
import { hashPassword } from '#api/platform/passwords.ts';
import { checkNewPassword } from './password-rules.ts';

/**
 * The hash of a new password that keeps the rules: not a common one, nor little more than the
 * studio's or the person's own name. Throws `invalid-input` at `path`.
 */
export async function hashNewPassword(
  password: string,
  person: { readonly name: string; readonly email: string | null },
  path: readonly string[] = ['password'],
): Promise<string> {
  const studio = await Studio.findOne();
  const address = (person.email ?? '').split('@').flatMap((part) => part.split('.'));
  const names = [studio?.name ?? '', ...person.name.split(' '), ...address];
  checkNewPassword(password, names, path);
  return hashPassword(password);
}
