import type { Cake, Tier } from '#shared/contracts/design.ts';
import type { Advice, Proposal } from '#shared/contracts/estimates.ts';
import type { Menu, TierSize } from '#shared/contracts/menu.ts';
import { formatLength } from './measures.ts';
import { note } from './note.ts';
import type { PortionCount } from './portions.ts';
import type { ResolvedDesign } from './resolve-design.ts';
import { smallestStepMm } from './sizes.ts';
import { supportsOf } from './supports.ts';

/** Whether the cake feeds everybody, can be baked and stands up. */
export function cakeAdvice(
  resolved: ResolvedDesign,
  portions: PortionCount,
  proposals: readonly Proposal[],
): Advice[] {
  const { cake } = resolved.design;
  return [
    ...portionAdvice(cake, portions, proposals),
    ...(cake === null || cake.kind !== 'tiered'
      ? []
      : [...sizeAdvice(cake, resolved.menu), ...stepAdvice(cake, resolved.menu)]),
    ...supportAdvice(resolved),
  ];
}

/** Over this share of the portions wanted, a smaller cake is worth a word. */
const plenty = 1.4;

function portionAdvice(
  cake: Cake | null,
  { wanted, fed }: PortionCount,
  proposals: readonly Proposal[],
): Advice[] {
  if (cake === null) {
    if (proposals.length > 0) return [];
    return [
      note({
        code: 'portions',
        level: 'care',
        step: 'cake',
        about: 'portions',
        sentence: `No cake we can stack feeds ${wanted}.`,
        instead: 'Take sheets, or write to us: a cutting cake from the kitchen feeds the rest.',
      }),
    ];
  }
  const ways = proposals.map((it) => ({
    label: `${it.name}, ${it.portions} portions`,
    patch: {
      cake: { kind: 'tiered' as const, tiers: it.tiers, sheet: null, coating: cake.coating },
    },
  }));
  if (fed < wanted) {
    return [
      note({
        code: 'portions',
        level: 'care',
        step: 'cake',
        about: 'portions',
        sentence: `This feeds ${fed} of the ${wanted} you want to feed.`,
        instead: ways.length === 0 ? 'A sheet beside it would feed the rest.' : 'These would do.',
        ways,
      }),
    ];
  }
  if (fed <= wanted * plenty || fed - wanted < 10) return [];
  return [
    note({
      code: 'portions',
      level: 'ok',
      step: 'cake',
      about: 'portions',
      sentence: `There will be about ${fed - wanted} portions over.`,
      instead: ways.length === 0 ? '' : 'A smaller cake would do.',
      ways,
    }),
  ];
}

const fits = (size: TierSize, { shape, widthMm, depthMm }: Tier): boolean =>
  size.shape === shape &&
  ((size.widthMm === widthMm && size.depthMm === depthMm) ||
    (size.widthMm === depthMm && size.depthMm === widthMm));

/** The studio bakes what its tins, oven, fridge and boxes allow. */
function sizeAdvice(cake: Cake, menu: Menu): Advice[] {
  const lead = menu.studio.lengthLead;
  return cake.tiers.flatMap((tier, index): Advice[] => {
    const size = menu.tierSizes.find((it) => fits(it, tier));
    if (size?.heightsMm.includes(tier.heightMm) === true) return [];
    const nearest = size ?? nearestSize(menu.tierSizes, tier);
    const heightMm =
      nearest === undefined ? undefined : nearestOf(nearest.heightsMm, tier.heightMm);
    const measures = `${formatLength(tier.widthMm, lead)} ${tier.shape}, ${formatLength(tier.heightMm, lead)} high`;
    const shared = {
      code: 'too-big',
      level: 'stop',
      step: 'cake',
      about: `size:${index}`,
      sentence: `We have no tin for a tier of ${measures}.`,
    } as const;
    if (nearest === undefined || heightMm === undefined) {
      return [note({ ...shared, instead: 'Choose another shape.' })];
    }
    const { widthMm, depthMm } = nearest;
    const tiers = cake.tiers.map((it, i) =>
      i === index ? { ...it, widthMm, depthMm, heightMm } : it,
    );
    const label = `${formatLength(widthMm, lead)}, ${formatLength(heightMm, lead)} high`;
    return [
      note({
        ...shared,
        instead: 'The nearest we bake is this.',
        ways: [{ label, patch: { cake: { ...cake, tiers } } }],
      }),
    ];
  });
}

function nearestSize(sizes: readonly TierSize[], tier: Tier): TierSize | undefined {
  const distance = (it: TierSize) =>
    Math.abs(it.widthMm - tier.widthMm) + Math.abs(it.depthMm - tier.depthMm);
  return sizes
    .filter((it) => it.shape === tier.shape)
    .toSorted((a, b) => distance(a) - distance(b))[0];
}

const nearestOf = (values: readonly number[], wanted: number): number | undefined =>
  values.toSorted((a, b) => Math.abs(a - wanted) - Math.abs(b - wanted))[0];

function stepAdvice(cake: Cake, menu: Menu): Advice[] {
  const lead = menu.studio.lengthLead;
  return cake.tiers.flatMap((tier, index): Advice[] => {
    const above = cake.tiers[index + 1];
    if (above === undefined) return [];
    const step = Math.min(tier.widthMm - above.widthMm, tier.depthMm - above.depthMm);
    // A millimetre short is rounding between inches and millimetres, not a different cake.
    if (step >= smallestStepMm - 1) return [];
    const overhangs = step < 0;
    return [
      note({
        code: 'too-big',
        level: overhangs ? 'stop' : 'care',
        step: 'cake',
        about: `step:${index}`,
        sentence: overhangs
          ? 'An upper tier is wider than the one under it and would not stand.'
          : `Two tiers differ by less than ${formatLength(smallestStepMm, lead)}: there is little room for a border or flowers between them.`,
        instead: overhangs
          ? 'Put the wider tier below.'
          : 'A smaller upper or a wider lower tier looks better and stands better.',
        talk: overhangs,
      }),
    ];
  });
}

function supportAdvice({ tiers }: ResolvedDesign): Advice[] {
  const { boards, dowels } = supportsOf(tiers);
  if (boards === 0) return [];
  const inside =
    dowels === 0
      ? count(boards, 'board')
      : `${count(boards, 'board')} and ${count(dowels, 'dowel')}`;
  return [
    note({
      code: 'supports',
      level: 'ok',
      step: 'cake',
      about: 'supports',
      sentence: `Hidden inside: ${inside}. Take them out before eating.`,
      instead: 'The care card shows where they are.',
    }),
  ];
}

const count = (n: number, one: string): string => `${n} ${one}${n === 1 ? '' : 's'}`;
