import { describe, expect, it } from 'vitest';
import { attemptFor, earlierBodies } from './attempt.ts';

const key = (name: string) => () => name;

describe('one order, however often it is sent', () => {
  it('keeps the key while the end of the last try is unknown, even if answers changed', () => {
    const first = attemptFor('a', null, key('k1'));
    expect(first).toEqual({ key: 'k1', bodies: ['a'] });
    expect(attemptFor('a', first, key('k2'))).toEqual(first);
    const changed = attemptFor('b', first, key('k2'));
    expect(changed).toEqual({ key: 'k1', bodies: ['a', 'b'] });
    expect(earlierBodies(changed, 'b')).toEqual(['a']);
  });

  it('takes a new key once the last try has ended', () => {
    expect(attemptFor('b', null, key('k2')).key).toBe('k2');
  });
});
