import { invalidField } from '#api/platform/app-error.ts';
import { commonPasswords } from './common-passwords.ts';

/** Letters and digits alone, in lower case: what people vary first does not count. */
function bare(text: string): string {
  return text
    .normalize('NFKC')
    .toLowerCase()
    .replaceAll(/[^\p{L}\p{N}]/gu, '');
}

const common = new Set(commonPasswords.map(bare));

/** Steps of two neighbouring characters that count as no choice: the same, or one up or down. */
function isRun(text: string): boolean {
  const points = Array.from(text, (letter) => letter.codePointAt(0) ?? 0);
  const steps = points.slice(1).map((point, index) => point - (points[index] ?? 0));
  return steps.filter((step) => Math.abs(step) <= 1).length >= steps.length * 0.8;
}

/** A short piece over and over, such as `cakecakecakecake`. */
function isRepetition(text: string): boolean {
  for (let length = 1; length <= Math.min(8, text.length / 2); length += 1) {
    const piece = text.slice(0, length);
    if (piece.repeat(Math.ceil(text.length / length)).startsWith(text)) return true;
  }
  return false;
}

/** Words anybody would try first for this account; short ones are in every sentence. */
function contextWords(names: readonly string[]): string[] {
  return names.map(bare).filter((word) => word.length >= 4);
}

/**
 * Refuses a new password that others would guess first: a common one, a run, a repetition, or
 * little more than the studio's or the person's own name (NIST SP 800-63B-4, section 3.1.1.2).
 * Its length is the contract's.
 * @param names the studio's name, the person's name and address
 */
export function checkNewPassword(
  password: string,
  names: readonly string[],
  path: readonly string[] = ['password'],
): void {
  const text = bare(password);
  const withoutFigures = text.replaceAll(/^\p{N}+|\p{N}+$/gu, '');
  if (common.has(text) || common.has(withoutFigures) || isRun(text) || isRepetition(text)) {
    throw invalidField(path, 'Many people use this one; a few words of your own do better.');
  }
  const left = contextWords(names).reduce((rest, word) => rest.replaceAll(word, ''), text);
  if (left.length < 8) {
    throw invalidField(path, 'Leave the studio’s name and your own out of it.');
  }
}
