import { describe, expect, it } from 'vitest';
import type { Actor } from '#api/platform/actor.ts';
import { mayPhoto } from './photos.policy.ts';

const visitor: Actor = { kind: 'visitor' };

describe('who may do what with a photo', () => {
  it.each([
    // [sees its order (null: belongs to none), holds its key, may see, may remove]
    [null, false, false, false],
    [null, true, true, true],
    [false, false, false, false],
    [false, true, false, false],
    [true, false, true, false],
    [true, true, true, false],
  ])('order %s, key %s: see %s, remove %s', (seesOrder, holdsKey, see, remove) => {
    const photo = { seesOrder, holdsKey };
    expect(mayPhoto(visitor, 'see', photo)).toBe(see);
    expect(mayPhoto(visitor, 'remove', photo)).toBe(remove);
  });
});
