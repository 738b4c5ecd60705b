import type { DietId } from '#shared/contracts/vocabulary.ts';
import { formatList } from '#shared/dates/format.ts';
import { dietClashes } from './clashes.ts';
import { note, type Noted } from './note.ts';
import { capitalise } from './sentences.ts';
import type { Situation } from './situation.ts';
import { waysWithout } from './whole-cakes.ts';

const dietWords: Record<DietId, string> = {
  vegetarian: 'vegetarian',
  vegan: 'vegan',
  halal: 'halal',
  kosher: 'kosher',
  'no-alcohol': 'without alcohol',
  'no-gelatine': 'without gelatine',
};

/** Diets that are about one thing alone; the sentence names that thing. */
const substances = { 'no-alcohol': 'Alcohol', 'no-gelatine': 'Gelatine' } as const;

const isSubstance = (diet: DietId): diet is keyof typeof substances => diet in substances;

/** Diets that are more than a list of ingredients. */
const certified: readonly DietId[] = ['halal', 'kosher'];

/** What of the whole cake does not go with the guests' diets, and what would. */
export function dietAdvice(situation: Situation): Noted[] {
  const { parts, resolved } = situation;
  return resolved.design.guests.diets.flatMap((diet): Noted[] => {
    const clashing = parts.flatMap((part) => {
      const what = part.unread ? ['a label we have not read'] : dietClashes(part.contents, diet);
      if (what.length === 0) return [];
      // "Alcohol is in Rum caramel" needs no "(alcohol)" after it.
      return [isSubstance(diet) ? part.name : `${part.name} (${formatList(what)})`];
    });
    const shared = { code: 'diet', level: 'care', step: 'cake', about: `diet:${diet}` } as const;
    const askUs = `${capitalise(dietWords[diet])} is more than a list of ingredients: ask us which of ours carry a certificate.`;
    if (clashing.length > 0) {
      const ways = waysWithout(situation, (it) => dietClashes(it, diet).length > 0);
      return [
        note({
          ...shared,
          sentence: isSubstance(diet)
            ? `${substances[diet]} is in ${formatList(clashing)}.`
            : `Not ${dietWords[diet]}: ${formatList(clashing)}.`,
          instead: [
            ways.length === 0
              ? 'Nothing on our menu makes this cake that way; write to us.'
              : 'By their ingredients these would be.',
            ...(certified.includes(diet) ? [askUs] : []),
          ].join(' '),
          ways,
        }),
      ];
    }
    return certified.includes(diet) && parts.length > 0
      ? [
          note({
            ...shared,
            sentence: askUs,
            instead: 'Write to us before you send the order, or in its note.',
          }),
        ]
      : [];
  });
}
