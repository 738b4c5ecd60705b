import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { newPassword } from '#shared/contracts/accounts.ts';
import { commonPasswords } from './common-passwords.ts';
import { checkNewPassword } from './password-rules.ts';

const names = ['Oxbow Lane Cake Studio', 'Maren', 'Holt', 'maren', 'oxbowlane', 'example'];
const refuses = (password: string) =>
  expect(() => checkNewPassword(password, names), password).toThrow();
const takes = (password: string) =>
  expect(() => checkNewPassword(password, names), password).not.toThrow();

/** NIST SP 800-63B-4, section 3.1.1.2: length, no composition rules, a blocklist. */
describe('new passwords', () => {
  it('need 15 characters and nothing else of them', () => {
    expect(newPassword.safeParse('fourteen chars').success).toBe(false);
    expect(newPassword.safeParse('fifteen   chars').success).toBe(true);
    for (const password of [
      'plum jam on rye toast',
      'grauer himmel über dem fluss',
      '七つの匙とレモンのカードと青い鉢',
    ]) {
      expect(newPassword.safeParse(password).success).toBe(true);
      takes(password);
    }
  });

  it('are none that many would try, however they are dressed up', () => {
    for (const password of commonPasswords) refuses(password);
    for (const password of [
      'Correct-Horse-Battery-Staple',
      'ILOVEYOUFOREVER!!!',
      'to be or not to be 123',
      '1234567890123456',
      'abcdefghijklmnopq',
      'zzzzzzzzzzzzzzzz',
      'cakecakecakecake',
      'PasswordPassword1',
    ]) {
      refuses(password);
    }
  });

  it('are not the studio’s or one’s own name with something added', () => {
    for (const password of [
      'oxbow lane cake studio',
      'Maren Holt Maren Holt',
      'maren@oxbowlane.example',
      'MarenHolt2026!!',
    ]) {
      refuses(password);
    }
    takes('maren sings to her sourdough');
  });

  it('are taken when they are a few words chosen at random', () => {
    const word = fc.stringMatching(/^[a-z]{5,9}$/);
    fc.assert(
      fc.property(fc.uniqueArray(word, { minLength: 4, maxLength: 6 }), (words) => {
        fc.pre(!names.some((name) => words.join('').includes(name.toLowerCase())));
        fc.pre(new Set(words.join('')).size > 8);
        takes(words.join(' '));
      }),
      { numRuns: 100 },
    );
  });
});
