import { describe, expect, it } from 'vitest';
import { spellBack, spelledWords } from './spelled.ts';

describe('spelling back', () => {
  it('says capitals, spaces and signs', () => {
    expect(spellBack('Jo & 4!').map((it) => it.said)).toEqual([
      'capital J',
      'o',
      'space',
      'and sign',
      'space',
      '4',
      'exclamation mark',
    ]);
  });

  it('takes an emoji or an accented letter as one sign, in any direction of writing', () => {
    expect(spellBack('Zoë 👩‍🍳')).toHaveLength(5);
    expect(spellBack('سلام')).toHaveLength(4);
  });

  it('keeps words whole, each with the space after it', () => {
    const words = spelledWords(spellBack('Jo & Sam')).map((word) => word.map((it) => it.sign));
    expect(words.map((word) => word.join(''))).toEqual(['Jo ', '& ', 'Sam']);
  });

  it('has nothing to say about nothing', () => {
    expect(spellBack('  ')).toEqual([]);
  });
});
