import type { Actor } from '#api/platform/actor.ts';

export type PhotoAction = 'see' | 'remove';

export type PhotoResource = {
  /** Whether the actor may see the order it belongs to; null while it belongs to none. */
  readonly seesOrder: boolean | null;
  /** Whether the picture's claim key was shown. */
  readonly holdsKey: boolean;
};

type Rule = (actor: Actor, photo: PhotoResource) => boolean;

const rules: Readonly<Record<PhotoAction, Rule>> = {
  see: (_actor, { seesOrder, holdsKey }) => seesOrder ?? holdsKey,
  // Once it belongs to an order it stays with it.
  remove: (_actor, { seesOrder, holdsKey }) => seesOrder === null && holdsKey,
};

export function mayPhoto(actor: Actor, action: PhotoAction, photo: PhotoResource): boolean {
  return rules[action](actor, photo);
}
