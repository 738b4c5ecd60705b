import type { Coating } from '#shared/contracts/design.ts';
import { formatList } from '#shared/dates/format.ts';
import { coatKey, distinctCoats } from './advice-setting.ts';
import { isDeepColour } from './deep-colour.ts';
import { detailOf, fineness } from './detail.ts';
import { note, type Noted, type WayOut } from './note.ts';
import {
  coatingName,
  type ResolvedCoating,
  type ResolvedDecoration,
  type ResolvedDesign,
} from './resolve-design.ts';
import { orList } from './sentences.ts';
import type { Situation } from './situation.ts';
import { otherCoats } from './ways-out.ts';
import { countCharacters, wordsFit } from './words-fit.ts';

/** What fine work, words, flowers, wires and deep colours ask for. */
export function lookAdvice(situation: Situation): Noted[] {
  const { resolved } = situation;
  return [
    ...detailAdvice(situation),
    ...finishAdvice(situation),
    ...wordsAdvice(resolved),
    ...inedibleAdvice(resolved),
    ...smallPartsAdvice(resolved),
    ...glitterAdvice(resolved),
    ...flowerAdvice(resolved),
    ...deepColourAdvice(resolved),
  ];
}

function detailAdvice(situation: Situation): Noted[] {
  const { tiers, decorations } = situation.resolved;
  const tooFine = new Map<string, { coat: ResolvedCoating; wants: ResolvedDecoration[] }>();
  for (const wanted of decorations) {
    const { placed, decoration } = wanted;
    const on = tiers.filter((it) => placed.tier === null || it.index === placed.tier);
    for (const coat of distinctCoats(on)) {
      if (fineness[detailOf(coat)] >= fineness[decoration.needs]) continue;
      const known = tooFine.get(coatKey(coat))?.wants ?? [];
      tooFine.set(coatKey(coat), { coat, wants: [...known, wanted] });
    }
  }
  return [...tooFine].map(([key, { coat, wants }]) => {
    const needed = Math.max(...wants.map((it) => fineness[it.decoration.needs]));
    const ways = otherCoats(situation, coat, (it) => fineness[detailOf(it)] >= needed);
    const names = [...new Set(wants.map((it) => it.decoration.name))];
    const wanted = new Set(wants.map((it) => it.decoration.id));
    const { look } = situation.resolved.design;
    const plainer: WayOut[] =
      ways.length > 0 || look === null
        ? []
        : [
            {
              label: `Leave out ${formatList(names)}`,
              patch: {
                look: {
                  ...look,
                  decorations: look.decorations.filter((it) => !wanted.has(it.decorationId)),
                },
              },
            },
          ];
    return note({
      code: 'detail',
      level: 'stop',
      step: 'look',
      about: `detail:${key}`,
      sentence: `${coatingName(coat)} is too soft for ${formatList(names)}.`,
      plain: `${coatingName(coat)} holds ${detailWords[detailOf(coat)]}; asked for: ${formatList(names)}.`,
      instead:
        ways.length === 0
          ? 'Leave it out, or ask us for something plainer.'
          : `${orList(ways.map((it) => it.label))} would hold it.`,
      ways: [...ways, ...plainer],
      talk: true,
    });
  });
}

const detailWords = {
  none: 'no detail',
  soft: 'soft piping, no fine detail',
  fine: 'fine detail',
} as const;

function finishAdvice(situation: Situation): Noted[] {
  const { resolved } = situation;
  const { cake } = resolved.design;
  const { roughUpTo } = resolved.menu.kitchen;
  return distinctCoats(resolved.tiers).flatMap((coat): Noted[] => {
    const { covering, style, finish } = coat;
    const [first] = covering.finishes;
    if (cake !== null && first !== undefined && !covering.finishes.includes(finish)) {
      const change = (it: Coating | null) =>
        it !== null && it.covering === covering.id && it.finish === finish
          ? { ...it, finish: first }
          : it;
      return [
        note({
          code: 'detail',
          level: 'stop',
          step: 'setting',
          about: `finish:${coatKey(coat)}`,
          sentence: `We do not make ${coatingName(coat)} with a ${finish} finish.`,
          instead: `It comes ${orList(covering.finishes)}.`,
          ways: [
            {
              label: `Make it ${first}`,
              patch: {
                cake: {
                  ...cake,
                  coating: change(cake.coating),
                  tiers: cake.tiers.map((it) => ({ ...it, coating: change(it.coating) })),
                },
              },
            },
          ],
        }),
      ];
    }
    const rough = covering.id === 'buttercream' && style !== null && style.smoothness <= roughUpTo;
    if (!rough || finish !== 'smooth') return [];
    const ways = otherCoats(
      situation,
      coat,
      (it) => it.covering.id === 'buttercream' && (it.style?.smoothness ?? 0) > roughUpTo,
    );
    return [
      note({
        code: 'detail',
        level: 'care',
        step: 'setting',
        about: `smooth:${coatKey(coat)}`,
        sentence: `${coatingName(coat)} is hard to get perfectly smooth.`,
        instead:
          ways.length === 0
            ? 'A textured finish suits it better.'
            : `A textured finish suits it better; ${orList(ways.map((it) => it.label))} would be smoother.`,
        ways,
      }),
    ];
  });
}

/** What is written on one tier shares its room, however many lines it comes in. */
function wordsAdvice({ design, tiers, menu }: ResolvedDesign): Noted[] {
  if (tiers.length === 0) return [];
  const written = new Map<number, number>();
  return (design.look?.words ?? []).flatMap((words, index): Noted[] => {
    if (words.text.trim() === '') return [];
    const shared = { code: 'words-length', level: 'stop', step: 'look' } as const;
    const about = `words:${index}`;
    const tier = tiers[words.tier];
    if (tier === undefined) {
      return [
        note({
          ...shared,
          about,
          sentence: `“${words.text}” is meant for a tier that is no longer there.`,
          instead: 'Choose another tier for it.',
        }),
      ];
    }
    const fit = wordsFit(tier.block.widthMm, menu);
    const length = (written.get(words.tier) ?? 0) + countCharacters(words.text);
    written.set(words.tier, length);
    if (length <= fit) return [];
    return [
      note({
        ...shared,
        about,
        sentence: `“${words.text}” makes ${length} characters; that tier has room for ${fit}.`,
        instead: 'Shorten it, or put it on a wider tier.',
      }),
    ];
  });
}

const namesOf = (decorations: readonly ResolvedDecoration[]): string =>
  formatList([...new Set(decorations.map((it) => it.decoration.name))]);

function inedibleAdvice({ decorations }: ResolvedDesign): Noted[] {
  const taken = decorations.filter((it) => it.decoration.edge === 'remove-before-eating');
  const touching = decorations.filter((it) => it.decoration.edge === 'food-contact-only');
  const cautions = [...new Set([...taken, ...touching].map((it) => it.decoration.caution))]
    .filter((it) => it !== '')
    .join(' ');
  return [
    ...(taken.length === 0
      ? []
      : [
          note({
            code: 'inedible',
            level: 'care',
            step: 'look',
            about: 'inedible',
            sentence: `Take off before eating: ${namesOf(taken)}.`,
            instead: cautions,
          }),
        ]),
    ...(touching.length === 0
      ? []
      : [
          note({
            code: 'inedible',
            level: 'care',
            step: 'look',
            about: 'touches-only',
            sentence: `May touch the cake but is not for eating: ${namesOf(touching)}.`,
            instead: taken.length === 0 ? cautions : '',
          }),
        ]),
  ];
}

function smallPartsAdvice({ decorations, design }: ResolvedDesign): Noted[] {
  const small = decorations.filter((it) => it.decoration.smallParts);
  if (small.length === 0) return [];
  const young = design.guests.infants || design.guests.susceptible;
  return [
    note({
      code: 'small-parts',
      level: young ? 'care' : 'ok',
      step: 'look',
      about: 'small-parts',
      sentence: `Small enough for a young child to choke on: ${namesOf(small)}.`,
      instead: 'Pick them off the slices of young children.',
    }),
  ];
}

/**
 * Flowers often sold for tables that are poisonous; named in poison-control and botanic lists the
 * world over (memory).
 */
export const poisonousFlowers = [
  'lily of the valley',
  'foxglove',
  'oleander',
  'hydrangea',
  'daffodil',
  'narcissus',
  'delphinium',
  'larkspur',
  'monkshood',
  'sweet pea',
  'hellebore',
  'autumn crocus',
  'anemone',
  'ranunculus',
  'poinsettia',
  'calla',
] as const;

function flowerAdvice({ decorations }: ResolvedDesign): Noted[] {
  const brought = decorations.filter(
    ({ decoration, placed }) =>
      placed.source !== 'studio' && (decoration.glyph === 'flower' || decoration.glyph === 'leaf'),
  );
  if (brought.length === 0) return [];
  return [
    note({
      code: 'flowers',
      level: 'care',
      step: 'look',
      about: 'flowers',
      sentence: `Tell your florist they stand on food: unsprayed, stems wrapped, and none of the poisonous ones (${formatList(poisonousFlowers)}).`,
      instead: 'Bring us the names of the flowers; we do not put on what we do not know.',
    }),
  ];
}

/** Glyphs of what is strewn or brushed on. */
const strewn: readonly string[] = ['sprinkle', 'pearl'];

/**
 * "Non-toxic" glitter and dusts are not for eating: what is must say edible and list what is in it
 * (US FDA, "Avoid Potentially Unsafe Non-Edible Products Used to Decorate Foods").
 */
function glitterAdvice({ design, decorations }: ResolvedDesign): Noted[] {
  const brought = decorations.some(
    ({ placed, decoration }) => placed.source !== 'studio' && strewn.includes(decoration.glyph),
  );
  const named = /\b(?:glitter|lust(?:er|re)|dust)\b/i.test(design.look?.note ?? '');
  if (!brought && !named) return [];
  return [
    note({
      code: 'inedible',
      level: 'care',
      step: 'look',
      about: 'glitter',
      sentence:
        'A packet that says “non-toxic” is not for eating: glitter and dusts must say “edible” and list what is in them.',
      plain: 'Glitter or dust: put on only what says edible and lists its ingredients.',
      instead: 'Bring us the packet, or take ours.',
    }),
  ];
}

function deepColourAdvice({ design, tiers, decorations }: ResolvedDesign): Noted[] {
  const colours = [
    ...tiers.map((it) => it.coating?.colour ?? null),
    ...(design.look?.palette ?? []),
    ...decorations.map((it) => it.placed.colour),
  ];
  const deep = colours.some((it) => it !== null && isDeepColour(it));
  if (!deep) return [];
  return [
    note({
      code: 'deep-colour',
      level: 'care',
      step: 'look',
      about: 'deep-colour',
      sentence:
        'Deep colors stain lips, fingers and cloth, and may bleed into paler ones overnight.',
      instead: 'A paler tint, or the deep one in small touches, behaves better.',
    }),
  ];
}
