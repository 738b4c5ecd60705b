import type { Advice } from '#shared/contracts/estimates.ts';
import { formatList } from '#shared/dates/format.ts';
import { note } from './note.ts';
import type { Situation } from './situation.ts';
import { waysWithout } from './ways-out.ts';

/** Eggs, honey, infants and alcohol: what some guests should not be served. */
export function eatingAdvice(situation: Situation): Advice[] {
  return [
    ...eggAdvice(situation),
    ...honeyAdvice(situation),
    ...infantAdvice(situation),
    ...alcoholAdvice(situation),
  ];
}

/**
 * Consumer advisory for egg that is neither pasteurised nor cooked to its limit (FDA Food Code
 * 2022, 3-603.11), which is not served to highly susceptible people (3-801.11). Our own words;
 * the local code decides.
 */
function eggAdvice(situation: Situation): Advice[] {
  const raw = situation.parts.filter((it) => it.contents.undercookedEgg).map((it) => it.name);
  if (raw.length === 0) return [];
  const made = `${formatList(raw)} ${raw.length === 1 ? 'is' : 'are'} made with egg that is not cooked through.`;
  if (!situation.resolved.design.guests.susceptible) {
    return [
      note({
        step: 'cake',
        code: 'egg',
        level: 'care',
        about: 'egg',
        sentence: `${made} Raw or undercooked egg can make people ill.`,
        instead:
          'Anyone pregnant, very young, old or with weak defences should leave it; tell us if such guests are coming.',
      }),
    ];
  }
  const ways = waysWithout(situation, (it) => it.undercookedEgg);
  return [
    note({
      step: 'cake',
      code: 'egg',
      level: 'stop',
      about: 'egg',
      sentence: `${made} It is not for the guests you told us of, who would fall ill more easily.`,
      instead:
        ways.length === 0
          ? 'Ask us to make it with pasteurised egg.'
          : 'Ask us to make it with pasteurised egg, or take one of these.',
      ways,
      talk: true,
    }),
  ];
}

/** Honey can carry spores that make infants under twelve months gravely ill (US CDC, botulism). */
function honeyAdvice(situation: Situation): Advice[] {
  const honeyed = situation.parts.filter((it) => it.contents.honey).map((it) => it.name);
  if (honeyed.length === 0) return [];
  const made = `Honey is in ${formatList(honeyed)}`;
  if (!situation.resolved.design.guests.infants) {
    return [
      note({
        step: 'cake',
        code: 'honey',
        level: 'ok',
        about: 'honey',
        sentence: `${made}: not for infants under twelve months.`,
        instead: '',
      }),
    ];
  }
  const ways = waysWithout(situation, (it) => it.honey);
  return [
    note({
      step: 'cake',
      code: 'honey',
      level: 'stop',
      about: 'honey',
      sentence: `${made}, and infants under twelve months must not have honey, baked or not.`,
      instead:
        ways.length === 0
          ? 'Bring something of their own for the infants.'
          : 'Take one of these, or bring something of their own for the infants.',
      ways,
      talk: true,
    }),
  ];
}

function infantAdvice({ parts, resolved }: Situation): Advice[] {
  if (!resolved.design.guests.infants || parts.length === 0) return [];
  return [
    note({
      step: 'cake',
      code: 'infants',
      level: 'care',
      about: 'infants',
      sentence:
        'For infants keep back everything small or hard from the outside of the cake, and anything with honey.',
      instead: '',
    }),
  ];
}

function alcoholAdvice({ parts, resolved }: Situation): Advice[] {
  const spirited = parts.filter((it) => it.contents.alcohol).map((it) => it.name);
  if (spirited.length === 0) return [];
  const { infants, susceptible, diets } = resolved.design.guests;
  // A diet without alcohol already says so itself, with ways out.
  if (diets.includes('no-alcohol') || diets.includes('halal')) return [];
  return [
    note({
      step: 'cake',
      code: 'alcohol',
      level: infants || susceptible ? 'care' : 'ok',
      about: 'alcohol',
      sentence: `Alcohol is in ${formatList(spirited)}.`,
      instead: 'Tell your guests, and those who serve children.',
    }),
  ];
}
