import type { LabelRegion } from '#shared/contracts/vocabulary.ts';
import { formatList } from '#shared/dates/format.ts';
import { formatTemperature } from './measures.ts';
import { note, type Noted } from './note.ts';
import type { Situation } from './situation.ts';
import { waysWithout } from './whole-cakes.ts';

/** Eggs, honey, infants and alcohol: what some guests should not be served. */
export function eatingAdvice(situation: Situation): Noted[] {
  return [
    ...eggAdvice(situation),
    ...honeyAdvice(situation),
    ...infantAdvice(situation),
    ...alcoholAdvice(situation),
  ];
}

/** Egg dishes count as cooked at this (FDA consumer guidance): 160 °F / 71 °C. */
const cookedEggC = 71;

/** Whose rules on raw egg are meant; the words beside it are the studio's own. */
const eggRules: Record<LabelRegion, string> = {
  US: 'FDA Food Code 3-603.11 and, for guests who would fall ill more easily, 3-801.11; your local code decides',
  EU: 'your national rules for raw egg in food that is eaten uncooked',
  UK: 'the FSA’s advice on raw and lightly cooked egg; your local authority decides',
};

/**
 * Consumer advisory for egg that is neither pasteurized nor cooked to its limit (FDA Food Code
 * 2022, 3-603.11), which is not served to highly susceptible people (3-801.11). The advisory's
 * words are the studio's; the local code decides. Methods that pour syrup into egg default to
 * pasteurised egg: the mix itself is not measured, so the syrup's heat counts for nothing here.
 */
function eggAdvice(situation: Situation): Noted[] {
  const raw = situation.parts.filter((it) => it.contents.undercookedEgg).map((it) => it.name);
  if (raw.length === 0) return [];
  const { design, menu } = situation.resolved;
  const { eggAdvisory, labelRegion, temperatureLead } = menu.studio;
  const made = `${formatList(raw)} ${raw.length === 1 ? 'is' : 'are'} made with egg that is neither pasteurized nor cooked through.`;
  const advisory = eggAdvisory === '' ? 'Raw or undercooked egg can make people ill.' : eggAdvisory;
  const toDo = `Use pasteurized egg, or bring the mix itself to ${formatTemperature(cookedEggC, temperatureLead)} on a probe and log it; else the advisory goes with the cake (${eggRules[labelRegion]}).`;
  const ways = waysWithout(situation, (it) => it.undercookedEgg);
  const shared = { step: 'cake', code: 'egg', about: 'egg', ways } as const;
  if (!design.guests.susceptible) {
    return [
      note({
        ...shared,
        level: 'care',
        sentence: `${made} ${advisory}`,
        plain: `Raw egg: ${formatList(raw)}. ${toDo}`,
        instead:
          'Ask us to make it with pasteurized egg, and tell us if anyone pregnant, very young, old or with weak defenses is coming.',
      }),
    ];
  }
  return [
    note({
      ...shared,
      level: 'stop',
      sentence: `${made} It is not for the guests you told us of, who would fall ill more easily.`,
      plain: `Raw egg at a table with susceptible guests: ${formatList(raw)}. ${toDo}`,
      instead:
        ways.length === 0
          ? 'Ask us to make it with pasteurized egg.'
          : 'Ask us to make it with pasteurized egg, or take one of these.',
      talk: true,
    }),
  ];
}

/**
 * Honey can carry spores that make infants under twelve months gravely ill (CDC on infant botulism
 * prevention; American Academy of Pediatrics); baking does not destroy them.
 */
function honeyAdvice(situation: Situation): Noted[] {
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
        instead: 'If infants are coming, tell us at the first step.',
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
      plain: `Honey at a table with infants: ${formatList(honeyed)}. Nothing of it for them, baked or not (CDC, infant botulism).`,
      instead:
        ways.length === 0
          ? 'Bring something of their own for the infants.'
          : 'Take one of these, or bring something of their own for the infants.',
      ways,
      talk: true,
    }),
  ];
}

function infantAdvice({ parts, resolved }: Situation): Noted[] {
  if (!resolved.design.guests.infants || parts.length === 0) return [];
  return [
    note({
      step: 'cake',
      code: 'infants',
      level: 'care',
      about: 'infants',
      sentence:
        'For infants keep back everything small or hard from the outside of the cake, and anything with honey.',
      instead: 'Their doctor knows best what they may eat yet.',
    }),
  ];
}

function alcoholAdvice(situation: Situation): Noted[] {
  const { parts, resolved } = situation;
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
      ways: infants || susceptible ? waysWithout(situation, (it) => it.alcohol) : [],
    }),
  ];
}
