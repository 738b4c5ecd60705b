import type { AllergyAnswer } from '#shared/contracts/menu.ts';
import type { LabelRegion, Severity } from '#shared/contracts/vocabulary.ts';
import { formatList } from '#shared/dates/format.ts';
import { allergenName, speciesName, spelledFor } from './allergen-names.ts';
import {
  byGravity,
  clashesWith,
  gravest,
  isAbout,
  isListed,
  mayContainLevel,
  speciesOf,
  stateFor,
  subjectOf,
  type ListedDeclaration,
} from './clashes.ts';
import { note, type Noted } from './note.ts';
import { strictestAnswer } from './owners-answer.ts';
import { capitalise, orList } from './sentences.ts';
import type { Situation } from './situation.ts';
import { waysWithout } from './whole-cakes.ts';

/**
 * What the guests' allergies mean for this cake and this kitchen. What is in it is said, never
 * what is not; a thing told in words waits for a baker.
 */
export function allergenAdvice(situation: Situation): Noted[] {
  const { allergies } = situation.resolved.design.guests;
  const told = allergies.filter((it) => !isListed(it)).map((it) => it.text.trim());
  return [
    ...onePerThing(allergies.filter(isListed)).flatMap((it) => adviceFor(it, situation)),
    ...[...new Set(told)].map(toldInWords),
  ];
}

/** A thing that guests keep from: the gravest declaration of it, with all that were made. */
type Thing = ListedDeclaration & { readonly all: readonly ListedDeclaration[] };

/** Two guests with the same allergy are one subject, as grave as the graver of them. */
function onePerThing(declarations: readonly ListedDeclaration[]): Thing[] {
  const things = new Map<string, Thing>();
  for (const declared of declarations) {
    const key = subjectOf(declared);
    const known = things.get(key);
    const all = [...(known?.all ?? []), declared];
    things.set(key, {
      ...declared,
      species: speciesOf(declared),
      guests: (known?.guests ?? 0) + declared.guests,
      severity: known === undefined ? declared.severity : graver(known.severity, declared.severity),
      all,
    });
  }
  return [...things.values()];
}

const graver = (a: Severity, b: Severity): Severity =>
  byGravity.indexOf(a) >= byGravity.indexOf(b) ? a : b;

function toldInWords(text: string): Noted {
  return note({
    code: 'allergy-text',
    level: 'stop',
    step: 'day',
    about: `allergy-text:${text}`,
    sentence: `You told us about “${text}”. A baker reads it and answers you before anything is confirmed.`,
    plain: `Told in words: “${text}”. Read every label for it, answer the customer and record the talk.`,
    instead: 'There is nothing you need to change before then.',
    talk: true,
  });
}

function adviceFor(declared: Thing, situation: Situation): Noted[] {
  const { parts, resolved } = situation;
  const inState = (state: 'contains' | 'unknown' | 'may-contain') =>
    parts
      .filter((it) => (it.unread ? 'unknown' : stateFor(it.contents, declared)) === state)
      .map((it) => it.name);
  const contained = inState('contains');
  const unknown = inState('unknown');
  const warned = inState('may-contain');
  const ways =
    contained.length + unknown.length > 0 ||
    (warned.length > 0 && mayContainLevel(declared.severity) === 'stop')
      ? waysWithout(situation, (it) => clashesWith(it, declared))
      : [];
  const shared = { declared, situation, ways };
  const found = [
    ...(contained.length === 0 ? [] : [containedAdvice(contained, shared)]),
    ...(unknown.length === 0 ? [] : [unknownAdvice(unknown, shared)]),
    ...(warned.length === 0 ? [] : [warnedAdvice(warned, shared)]),
    ...nearMiss(declared, situation),
  ];
  const handled = resolved.menu.studio.handles.some(
    (it) => it.state !== 'not-declared' && isAbout(it, declared),
  );
  return handled ? [...found, kitchenAdvice(shared)] : found;
}

type Shared = {
  readonly declared: Thing;
  readonly situation: Situation;
  readonly ways: Noted['ways'];
};

function containedAdvice(parts: readonly string[], shared: Shared): Noted {
  const { declared, situation, ways } = shared;
  const answer = strictestAnswer(declared.all, situation.resolved.menu.allergyRules);
  return note({
    code: 'allergen',
    level: 'stop',
    step: stepOf(shared),
    about: aboutOf('allergen', declared),
    sentence: `${capitalise(nameOf(shared))} ${isPlural(nameOf(shared)) ? 'are' : 'is'} in ${formatList(parts)}; ${whose(shared)}.`,
    plain: `Contains ${nameOf(shared)}: ${formatList(parts)}. ${told(shared)}. ${tableWords[answer]}`,
    instead: [wayWords(shared), answerWords[answer]].filter((it) => it !== '').join(' '),
    ways,
    talk: answer !== 'refuse',
  });
}

function unknownAdvice(parts: readonly string[], shared: Shared): Noted {
  const { declared, ways } = shared;
  return note({
    code: 'allergen-unknown',
    level: 'stop',
    step: stepOf(shared),
    about: aboutOf('allergen-unknown', declared),
    sentence: `We do not know yet about ${nameOf(shared)} in ${formatList(parts)}; ${whose(shared)}.`,
    plain: `Not known: ${nameOf(shared)} in ${formatList(parts)}. Read the label or ask the maker before you talk. ${told(shared)}.`,
    instead: `We have to read the label first. ${wayWords(shared)}`.trim(),
    ways,
    talk: true,
  });
}

function warnedAdvice(parts: readonly string[], shared: Shared): Noted {
  const { declared, ways } = shared;
  const level = mayContainLevel(declared.severity);
  return note({
    code: 'allergen',
    level,
    step: stepOf(shared),
    about: aboutOf('may-contain', declared),
    sentence: `A maker's label says there may be ${nameOf(shared)} in ${formatList(parts)}; ${whose(shared)}.`,
    plain: `Maker's warning, may contain ${nameOf(shared)}: ${formatList(parts)}. ${told(shared)}.`,
    instead:
      ways.length === 0 && level === 'care'
        ? 'Tell your guest, and let them decide.'
        : wayWords(shared),
    ways,
    talk: level === 'stop',
  });
}

/** Another nut than the one named: not a stop, but never passed over either. */
function nearMiss(declared: ListedDeclaration, { parts, resolved }: Situation): Noted[] {
  if (declared.species === null) return [];
  const others = parts.flatMap(({ contents }) =>
    contents.allergens.filter(
      (it) =>
        it.allergen === declared.allergen && it.state !== 'not-declared' && !isAbout(it, declared),
    ),
  );
  const species = [...new Set(others.flatMap((it) => it.species))].sort().map(speciesName);
  if (species.length === 0) return [];
  const kind = allergenName(declared.allergen, resolved.menu.studio.labelRegion);
  return [
    note({
      code: 'allergen',
      level: 'care',
      step: 'cake',
      about: aboutOf('near', declared),
      sentence: `You named ${speciesName(declared.species)}; this cake has ${formatList(species)} in it or in a warning on a label.`,
      instead: `If ${kind} other than ${speciesName(declared.species)} matter too, tell us.`,
    }),
  ];
}

function kitchenAdvice(shared: Shared): Noted {
  const { declared } = shared;
  const grave = gravest.includes(declared.severity);
  return note({
    code: 'kitchen',
    level: grave ? 'stop' : 'care',
    step: 'day',
    about: aboutOf('kitchen', declared),
    sentence: `We handle ${nameOf(shared)} in this kitchen, so traces can get into any cake we make; ${whose(shared)}.`,
    plain: `Handled in this kitchen: ${nameOf(shared)}. ${told(shared)}.`,
    instead: grave
      ? 'No choice of cake changes that, so there is nothing to choose instead: we talk it over with you before we say yes. Please ask the doctor who knows your guest, too.'
      : 'Tell your guest, and let them decide.',
    talk: grave,
  });
}

const aboutOf = (what: string, declared: ListedDeclaration): string =>
  `${what}:${subjectOf(declared)}`;

/** Before there is a cake it belongs to the day; else to where most of it is chosen. */
const stepOf = ({ situation }: Shared): Noted['step'] =>
  situation.parts.length > 0 && situation.parts.every((it) => it.kind === 'decoration')
    ? 'look'
    : 'cake';

const regionOf = ({ situation }: Shared): LabelRegion => situation.resolved.menu.studio.labelRegion;

const nameOf = (shared: Shared): string => {
  const { declared } = shared;
  return declared.species === null
    ? allergenName(declared.allergen, regionOf(shared))
    : speciesName(declared.species);
};

const reactions: Record<Severity, { readonly one: string; readonly many: string }> = {
  avoids: { one: 'one guest avoids it', many: 'guests avoid it' },
  intolerance: { one: 'one guest does not tolerate it', many: 'guests do not tolerate it' },
  coeliac: { one: 'one guest has coeliac disease', many: 'guests have coeliac disease' },
  allergy: { one: 'one guest is allergic to it', many: 'guests are allergic to it' },
  anaphylaxis: {
    one: 'one guest can have a severe reaction to it',
    many: 'guests can have a severe reaction to it',
  },
};

function whose(shared: Shared): string {
  const { guests, severity } = shared.declared;
  const { one, many } = reactions[severity];
  const words = guests === 1 ? one : `${guests} ${many}`;
  const ofRegion = spelledFor(regionOf(shared), words);
  return isPlural(nameOf(shared)) ? ofRegion.replace(/\bit$/, 'them') : ofRegion;
}

/** "Tree nuts are in ...": the list's plurals, and no other, end in s. */
const isPlural = (name: string): boolean => name.endsWith('s');

function wayWords({ ways, situation, declared }: Shared): string {
  if (situation.parts.length === 0) return '';
  if (ways.length === 0 && clashingParts(situation, declared)) {
    return 'Nothing on our menu makes this cake without it; write to us and we will say what we can do.';
  }
  return ways.length === 0 ? '' : `Instead: ${orList(ways.map((it) => it.label))}.`;
}

const clashingParts = ({ parts }: Situation, declared: ListedDeclaration): boolean =>
  parts.some((it) => it.unread || clashesWith(it.contents, declared));

/** To the customer. */
const answerWords: Record<AllergyAnswer, string> = {
  take: 'If your guest will not eat from this cake, tell us so.',
  talk: 'As it is, we talk with you before we take it.',
  refuse: 'As it is, we cannot take this order.',
};

/** To whoever bakes it: what the owner's table says of it. */
const tableWords: Record<AllergyAnswer, string> = {
  take: 'The owner’s table: take.',
  talk: 'The owner’s table: take after talking.',
  refuse: 'The owner’s table: refuse.',
};

const severityFacts: Record<Severity, string> = {
  avoids: 'avoided',
  intolerance: 'intolerance',
  coeliac: 'coeliac disease',
  allergy: 'allergy',
  anaphylaxis: 'anaphylaxis',
};

/** "Declared: anaphylaxis, 2 guests". */
function told(shared: Shared): string {
  const { severity, guests } = shared.declared;
  const how = spelledFor(regionOf(shared), severityFacts[severity]);
  return `Declared: ${how}, ${guests} ${guests === 1 ? 'guest' : 'guests'}`;
}
