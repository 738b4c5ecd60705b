import { describe, expect, it } from 'vitest';
import { safeNext } from './paths.ts';

describe('safeNext', () => {
  it.each(['/account', '/orders/K7Q2?x=1#key=2'])('goes on to %s', (next) => {
    expect(safeNext(next, '/home')).toBe(next);
  });

  it.each([
    null,
    '',
    'https://elsewhere.example',
    '//elsewhere.example',
    '/\\elsewhere.example',
    'account',
  ])('never leaves for %j', (next) => {
    expect(safeNext(next, '/home')).toBe('/home');
  });
});
