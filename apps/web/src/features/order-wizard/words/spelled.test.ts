import { describe, expect, it } from 'vitest';
import { spellBack } from './spelled.ts';

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

  it('has nothing to say about nothing', () => {
    expect(spellBack('  ')).toEqual([]);
  });
});
