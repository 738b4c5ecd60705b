import type { Decoration } from '#shared/contracts/menu.ts';
import type { AllergenState, LabelRegion } from '#shared/contracts/vocabulary.ts';
import { formatList } from '#shared/dates/format.ts';
import { allergenLabel } from '../allergen-names.ts';
import type { Part } from '../parts.ts';
import { timesOf } from '../piped.ts';
import type { ResolvedDesign } from '../resolve-design.ts';
import { capitalise } from '../sentences.ts';
import { inSentence } from './name-in-sentence.ts';
import { supportsOf } from '../supports.ts';
import { tierName } from '../tier-name.ts';

/** Decorations that stand on wires, picks or stems as a rule. */
const onStems: readonly string[] = ['flower', 'topper', 'leaf', 'figure'];

/**
 * Everything that has to come out of or off the cake on show before anybody eats, with its count:
 * boards and dowels, dummies, decorations that are not for eating with whatever they stand on.
 */
export function toRemove(resolved: ResolvedDesign): string[] {
  const { tiers } = resolved;
  const { boards, dowels } = supportsOf(tiers, resolved.menu.kitchen);
  const hidden = [count(boards, 'board'), count(dowels, 'dowel')].filter((it) => it !== '');
  const dummies = tiers.filter((it) => !it.real);
  return [
    ...(hidden.length === 0
      ? []
      : [`Hidden inside: ${formatList(hidden)}. Take them out as you cut; count them.`]),
    ...dummies.map(
      ({ index }) =>
        `${tierName(index, tiers.length)}: a dummy, not cake. Nothing on it is for eating.`,
    ),
    ...inedible(resolved).map(({ decoration, times }) => {
      const many = decoration.per === 'piece' && times > 1 ? `${times} × ` : '';
      const stems = onStems.includes(decoration.glyph) ? ', with any wires, picks and stems' : '';
      const made = madeWith(decoration, resolved.menu.studio.labelRegion);
      return `${many}${decoration.name}: not for eating. Take off first${stems}.${made}`;
    }),
  ];
}

/** What is not eaten touches what is: its allergens are told all the same. */
function madeWith({ contents }: Decoration, region: LabelRegion): string {
  const named = (state: AllergenState) =>
    contents.allergens.filter((it) => it.state === state).map((it) => allergenLabel(it, region));
  const contained = named('contains');
  const unknown = named('unknown');
  return [
    contained.length === 0 ? '' : ` Made with ${formatList(contained)}.`,
    unknown.length === 0 ? '' : ` Not known: whether ${formatList(unknown)} is in it.`,
  ].join('');
}

/** Decorations that are not for eating, each kind once with how many there are. */
function inedible({ tiers, decorations }: ResolvedDesign) {
  const kinds = new Map<string, { decoration: Decoration; times: number }>();
  for (const it of decorations) {
    const { decoration } = it;
    if (decoration.edge === 'edible') continue;
    const times = (kinds.get(decoration.id)?.times ?? 0) + timesOf(it, tiers.length);
    kinds.set(decoration.id, { decoration, times });
  }
  return [...kinds.values()];
}

function count(n: number, one: string): string {
  return n === 0 ? '' : `${n} ${one}${n === 1 ? '' : 's'}`;
}

/**
 * What some guests should not be served, and what can choke: small parts, alcohol, honey and
 * infants, and the consumer advisory for egg that is neither pasteurised nor cooked to its limit
 * (Food Code 2022, 3-603.11; the text is the studio's, the local code decides).
 */
export function cautionsOf(
  parts: readonly Part[],
  resolved: ResolvedDesign,
  eggAdvisory: string,
): string[] {
  const named = (has: (part: Part) => boolean) =>
    parts.filter(has).map((it) => inSentence(it.name));
  const raw = named((it) => it.contents.undercookedEgg);
  const honey = named((it) => it.contents.honey);
  const alcohol = named((it) => it.contents.alcohol);
  const small = [
    ...new Set(
      resolved.decorations
        .filter(({ decoration }) => decoration.smallParts)
        .map(({ decoration }) => decoration.name),
    ),
  ];
  const sentences = [
    raw.length === 0
      ? ''
      : `${capitalise(formatList(raw))} ${raw.length === 1 ? 'is' : 'are'} made with egg that is not cooked through. ${eggAdvisory}`.trim(),
    honey.length === 0
      ? ''
      : `Honey is, or may be, in ${formatList(honey)}: never for infants under twelve months.`,
    alcohol.length === 0 ? '' : `Alcohol is, or may be, in ${formatList(alcohol)}.`,
    small.length === 0
      ? ''
      : `Small parts (${formatList(small)}) can choke a young child: take them off first.`,
  ];
  return sentences.filter((it) => it !== '');
}
