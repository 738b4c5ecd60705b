import type { LabelReason, LabelText } from '#shared/contracts/cards.ts';
import type { AllergenEntry } from '#shared/contracts/menu.ts';
import type { AllergenId } from '#shared/contracts/vocabulary.ts';
import { formatDuration, formatList } from '#shared/dates/format.ts';
import type { LocalDate } from '#shared/dates/local-time.ts';
import type { FormulaNode } from '../derive-contents.ts';
import { formatTemperature } from '../measures.ts';
import { partWeights, type PieceWeights, type WeighedPart } from '../part-weights.ts';
import { partsOf, type Part } from '../parts.ts';
import { isPiped, timesOf } from '../piped.ts';
import { coatingName, type ResolvedBody, type ResolvedDesign } from '../resolve-design.ts';
import { named } from '../sentences.ts';
import { boardOf } from '../sizes.ts';
import { coldHoldingC, fsis } from '../time-out.ts';
import { allergenLines, gapSentence, labelGaps, type KitchenWord } from './allergen-lines.ts';
import { cautionsOf, toRemove } from './before-eating.ts';
import { ingredientStatement } from './ingredient-statement.ts';
import { inSentence } from './name-in-sentence.ts';
import { useByOf, type KeptPart } from './label-dates.ts';
import { netWeightText, smallestFigureMm, smallestXHeightMm } from './type-size.ts';
import { weighIngredients, type LabelledPart } from './weigh-ingredients.ts';

export type PartRef = Pick<WeighedPart, 'part' | 'id'>;

/** How long a part keeps, and whether it has to be held cold. */
export type PartKeeping = KeptPart & { readonly refrigerate: boolean; readonly formulaId: string };

/** All that labels of one order are made from. */
export type LabelInput = {
  /** By the formulas and the menu the order was made with. */
  readonly resolved: ResolvedDesign;
  /** What a part is made by; null for one that is made of nothing of its own. */
  readonly formulaOf: (part: PartRef) => FormulaNode | null;
  /** Null for a part that has no keeping of its own, such as a bought decoration. */
  readonly keepingOf: (part: PartRef) => PartKeeping | null;
  /** Allergens whose "may contain" rests on the owner's own assessment. */
  readonly assessed: ReadonlySet<AllergenId>;
  /**
   * Allergens of which it is said that nobody knows, beside those of the region's list; what guests
   * told of unless given.
   */
  readonly heeded?: readonly AllergenId[];
  readonly number: number;
  readonly occasion: string;
  readonly madeOn: LocalDate | null;
  /** When it leaves the studio. */
  readonly pickupAt: Date;
};

export type OrderLabelTexts = {
  readonly labels: readonly LabelText[];
  readonly reasons: readonly LabelReason[];
  readonly reminders: readonly string[];
};

/** What a label is about: the cake on show, or one of a kind of cutting cake. */
type Group = {
  readonly id: string;
  readonly copies: number;
  readonly kind: 'cake' | 'cutting-cake';
  readonly bodies: readonly ResolvedBody[];
  readonly pieces: readonly PieceWeights[];
  readonly decorated: boolean;
  /** Seen from above, cm2: the panel a label goes on. */
  readonly panelCm2: number;
};

/**
 * The labels of an order, one for the cake on show and one for each kind of cutting cake, and every
 * reason why they cannot be printed. Never says what is not in something. Throws `FormulaCycle`.
 */
export function labelsOf(input: LabelInput): OrderLabelTexts {
  const groups = groupsOf(input.resolved);
  const made = groups.map((group) => labelOf(group, input));
  const once = new Map(
    made.flatMap((it) => it.reasons).map((it) => [`${it.code} ${it.sentence}`, it]),
  );
  return {
    labels: made.map((it) => it.label),
    reasons: [
      ...(groups.length === 0 ? [reason('no-cake', 'There is no cake in this order.')] : []),
      ...once.values(),
    ],
    reminders: [...new Set(made.flatMap((it) => it.reminders))],
  };
}

function groupsOf(resolved: ResolvedDesign): Group[] {
  const { design, menu, tiers, cuttingCakes } = resolved;
  if (design.cake === null || tiers.length === 0) return [];
  const { pieces } = partWeights(resolved);
  const board = boardOf(design.cake, menu);
  return [
    {
      id: 'cake',
      copies: 1,
      kind: 'cake',
      bodies: tiers,
      pieces: pieces.filter((it) => it.kind !== 'cutting-cake'),
      decorated: true,
      panelCm2: board === null ? 0 : (board.widthMm * board.depthMm) / 100,
    },
    ...cuttingCakes.map((body, index): Group => ({
      id: `cutting-cake-${index}`,
      copies: body.count,
      kind: 'cutting-cake',
      bodies: [body],
      pieces: pieces.filter((it) => it.kind === 'cutting-cake' && it.index === index),
      decorated: false,
      panelCm2: (body.block.widthMm * body.block.depthMm) / 100,
    })),
  ];
}

function labelOf(
  group: Group,
  input: LabelInput,
): { label: LabelText; reasons: LabelReason[]; reminders: string[] } {
  const { resolved, formulaOf, assessed } = input;
  const { studio } = resolved.menu;
  const { labelRegion: region } = studio;
  const weights = weightsOf(group, resolved);
  const parts = partsOf(partialDesign(group, resolved));
  const nameOf = (ref: PartRef) => parts.find((it) => isPart(it, ref))?.name ?? ref.id;
  const labelled = weights.flatMap(({ ref, inCakeG }): LabelledPart[] => {
    const node = formulaOf(ref);
    return node === null ? [] : [{ name: nameOf(ref), node, finishedG: inCakeG }];
  });
  const ingredients = weighIngredients(labelled);
  const finishedG = weights.reduce((sum, it) => sum + it.inCakeG, 0);
  const netG = weights.reduce((sum, it) => sum + it.eatenG, 0);
  const declared =
    input.heeded ?? resolved.design.guests.allergies.flatMap((it) => it.allergen ?? []);
  const kitchen: KitchenWord = { handles: studio.handles, assessed };
  const { notKnown, ...lines } = allergenLines(
    ingredients,
    kitchen,
    region,
    declared,
    touchingAllergens(group, resolved),
  );
  const unread = unreadParts(group, input, parts);
  const keeping = weights.flatMap(({ ref }) => input.keepingOf(ref) ?? []);
  const useBy = useByOf(keeping, studio.zone);
  const label: LabelText = {
    id: group.id,
    copies: group.copies,
    region,
    studio: { name: studio.name, address: addressOf(studio) },
    product: productName(group),
    about: `${input.occasion}, No. ${input.number}`,
    ingredients: ingredientStatement(ingredients, region, finishedG),
    ...lines,
    notKnown: [...notKnown, ...unread.map((it) => it.printed)],
    net: { grams: netG, text: netWeightText(region, netG), weighed: false },
    madeOn: input.madeOn,
    useBy: useBy.date,
    keep: keepLines(keeping, input),
    remove: group.decorated ? toRemove(resolved) : [],
    cautions: cautionsOf(parts, partialDesign(group, resolved), studio.eggAdvisory),
    homeKitchen: studio.homeKitchenText,
    smallestXHeightMm: smallestXHeightMm(region, group.panelCm2),
    smallestFigureMm: smallestFigureMm(region, netG, group.panelCm2),
  };
  return {
    label,
    reasons: [
      ...labelGaps(ingredients, region, declared).map((gap): LabelReason => ({
        code: gap.kind === 'unknown' ? 'unknown-allergen' : 'kind-not-told',
        sentence: gapSentence(gap, region),
        ingredientId: gap.ingredientId,
        formulaId: null,
        confirmable: gap.kind === 'unknown',
      })),
      ...unread.map((it) => it.reason),
      ...keeping
        .filter((it) => it.keepsChilledHours === null)
        .map((it): LabelReason => ({
          ...reason(
            'shelf-life',
            `${it.name}: its formula does not say how long it keeps chilled.`,
          ),
          formulaId: it.formulaId,
        })),
      // A day that is over before the cake leaves is on nobody's label.
      ...(useBy.at !== null && useBy.at < input.pickupAt
        ? [
            reason(
              'shelf-life',
              `${useBy.because} keeps only until before the pickup: make it later in the plan, or look at its shelf life.`,
            ),
          ]
        : []),
      ...(label.studio.address === ''
        ? [reason('address', 'A label carries the studio’s address, and there is none yet.')]
        : []),
    ],
    reminders: remindersOf(label),
  };
}

type Weight = { readonly ref: PartRef; readonly inCakeG: number; readonly eatenG: number };

/**
 * Grams of each part: all of it for the order of ingredients (a dummy's coat too, since it touches
 * what is eaten and somebody will taste it), and what is eaten for the net weight.
 */
function weightsOf(group: Group, resolved: ResolvedDesign): Weight[] {
  const sums = new Map<string, Weight>();
  const add = (ref: PartRef, grams: number, eaten: boolean) => {
    const key = `${ref.part}:${ref.id}`;
    const before = sums.get(key);
    sums.set(key, {
      ref: { part: ref.part, id: ref.id },
      inCakeG: (before?.inCakeG ?? 0) + grams,
      eatenG: (before?.eatenG ?? 0) + (eaten ? grams : 0),
    });
  };
  group.pieces.forEach((piece, at) => {
    const real = group.bodies[at]?.real ?? true;
    for (const part of piece.parts) add(part, part.inCakeG, real);
  });
  if (group.decorated) {
    for (const it of resolved.decorations) {
      const { decoration } = it;
      if (decoration.edge !== 'edible' || isPiped(decoration)) continue;
      const grams = decoration.weightG * timesOf(it, resolved.tiers.length);
      add({ part: 'decoration', id: decoration.id }, grams, true);
    }
  }
  return [...sums.values()];
}

/** Of decorations that are taken off before eating. */
function touchingAllergens(group: Group, { decorations }: ResolvedDesign): AllergenEntry[] {
  if (!group.decorated) return [];
  return decorations
    .filter(({ decoration }) => decoration.edge !== 'edible')
    .flatMap(({ decoration }) => decoration.contents.allergens);
}

/** The design as far as this label is about it. */
function partialDesign(group: Group, resolved: ResolvedDesign): ResolvedDesign {
  return group.kind === 'cake'
    ? { ...resolved, cuttingCakes: [] }
    : {
        ...resolved,
        tiers: [],
        decorations: [],
        cuttingCakes: resolved.cuttingCakes.filter((it) => group.bodies.includes(it)),
      };
}

const partOf: Readonly<Record<Part['kind'], PartRef['part']>> = {
  sponge: 'sponge',
  filling: 'filling',
  buttercream: 'style',
  covering: 'covering',
  decoration: 'decoration',
};

const isPart = (part: Part, ref: PartRef): boolean =>
  partOf[part.kind] === ref.part && part.id === ref.id;

/** Eaten, and nobody here has read or entered what it is made of. */
function unreadParts(
  group: Group,
  { resolved, formulaOf }: LabelInput,
  parts: readonly Part[],
): { printed: string; reason: LabelReason }[] {
  if (!group.decorated) return [];
  const seen = new Set<string>();
  return resolved.decorations.flatMap(({ decoration, placed }) => {
    if (decoration.edge !== 'edible' || isPiped(decoration)) return [];
    const brought = placed.source !== 'studio';
    const node = formulaOf({ part: 'decoration', id: decoration.id });
    const empty = node === null || node.lines.length === 0;
    const key = `${decoration.id} ${brought}`;
    if ((!brought && !empty) || seen.has(key)) return [];
    seen.add(key);
    const name = parts.find((it) => it.id === decoration.id)?.name ?? decoration.name;
    return [
      {
        printed: `Not known: what ${name} is made of.`,
        reason: {
          ...reason(
            'brought',
            brought
              ? `${name}: ask whoever brings it for its label.`
              : `${name}: nobody has entered what it is made of.`,
          ),
          confirmable: true,
        },
      },
    ];
  });
}

function productName(group: Group): string {
  const distinct = (names: readonly string[]) => [...new Set(names)];
  const sponges = distinct(
    group.bodies.flatMap(({ sponge }) => (sponge === null ? [] : named(sponge.name, 'sponge'))),
  );
  const fillings = distinct(
    group.bodies.flatMap(({ filling }) => (filling === null ? [] : named(filling.name, 'filling'))),
  );
  const coats = distinct(
    group.bodies.flatMap(({ coating }) => (coating === null ? [] : coatingName(coating))),
  );
  const kind = group.kind === 'cake' ? 'Cake' : 'Cutting cake';
  const made = [sponges, fillings, coats]
    .filter((it) => it.length > 0)
    .map((names) => formatList(names.map(inSentence)));
  return made.length === 0 ? kind : `${kind}: ${made.join(', ')}`;
}

function keepLines(keeping: readonly PartKeeping[], { resolved }: LabelInput): string[] {
  const { labelRegion, temperatureLead: lead } = resolved.menu.studio;
  if (!keeping.some((it) => it.refrigerate)) return ['Keep cool and out of the sun.'];
  const cold = formatTemperature(coldHoldingC(labelRegion), lead);
  const hot = formatTemperature(fsis.hotDayC, lead);
  return [
    `Keep refrigerated, at ${cold} or colder. Out of the fridge ${formatDuration(fsis.minutesInAll)} at most in all, the drive included; ${formatDuration(fsis.minutesOnHotDay)} above ${hot}.`,
  ];
}

function addressOf(studio: ResolvedDesign['menu']['studio']): string {
  const { street, town, region, postcode } = studio;
  return [street, town, `${region} ${postcode}`.trim()].filter((it) => it !== '').join(', ');
}

function remindersOf(label: LabelText): string[] {
  return [
    'The net weight is worked out from the design. Weigh the cake, take off what its boards weigh, and write the grams.',
    ...(label.homeKitchen === ''
      ? [
          'Many places ask for a sentence about a home kitchen or a license. Check your local rules.',
        ]
      : ['The sentence about your kitchen is yours. Check your local rules for its wording.']),
  ];
}

function reason(code: LabelReason['code'], sentence: string): LabelReason {
  return { code, sentence, ingredientId: null, formulaId: null, confirmable: false };
}
