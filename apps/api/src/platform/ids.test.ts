import { describe, expect, it } from 'vitest';
import { deriveKey, hashKey, newCareCode, newId, newKey, newOrderCode } from './ids.ts';

const many = <T>(make: () => T): T[] => Array.from({ length: 2000 }, make);

describe('newId', () => {
  it('is a UUID of version 7 (RFC 9562, section 5.7) that begins with the time', () => {
    const before = Date.now();
    const id = newId();
    expect(id).toMatch(/^[0-9a-f]{8}-[0-9a-f]{4}-7[0-9a-f]{3}-[89ab][0-9a-f]{3}-[0-9a-f]{12}$/);
    const time = parseInt(id.replace('-', '').slice(0, 12), 16);
    expect(time).toBeGreaterThanOrEqual(before);
    expect(time).toBeLessThanOrEqual(Date.now());
  });

  it('never comes twice', () => {
    expect(new Set(many(newId)).size).toBe(2000);
  });
});

describe('newOrderCode', () => {
  it('has ten characters that cannot be taken for one another', () => {
    for (const code of many(newOrderCode)) expect(code).toMatch(/^[0-9A-HJKMNP-TV-Z]{10}$/);
  });

  it('uses all of them', () => {
    expect(new Set(many(newOrderCode).join('')).size).toBe(32);
  });
});

describe('newCareCode', () => {
  it('has sixteen characters of the same alphabet and never comes twice', () => {
    const codes = many(newCareCode);
    for (const code of codes) expect(code).toMatch(/^[0-9A-HJKMNP-TV-Z]{16}$/);
    expect(new Set(codes).size).toBe(2000);
  });
});

describe('keys', () => {
  it('carry 128 bits', () => {
    for (const key of [newKey(), deriveKey('secret', 'link', '1')]) {
      expect(Buffer.from(key, 'base64url')).toHaveLength(16);
    }
    expect(new Set(many(newKey)).size).toBe(2000);
  });

  it('are derived alike from the same, and otherwise from anything else', () => {
    const key = deriveKey('secret', 'link', '1');
    expect(deriveKey('secret', 'link', '1')).toBe(key);
    expect(deriveKey('other', 'link', '1')).not.toBe(key);
    expect(deriveKey('secret', 'lin', 'k1')).not.toBe(key);
  });

  it('are stored as SHA-256 (FIPS 180-4, the message "abc")', () => {
    expect(hashKey('abc')).toBe('ba7816bf8f01cfea414140de5dae2223b00361a396177a9cb410ff61f20015ad');
  });
});
