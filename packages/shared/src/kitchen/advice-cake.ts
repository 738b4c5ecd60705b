import type { Cake, Tier } from '#shared/contracts/design.ts';
import type { Proposal } from '#shared/contracts/estimates.ts';
import type { Menu, TierSize } from '#shared/contracts/menu.ts';
import { formatList } from '#shared/dates/format.ts';
import { formatLength } from './measures.ts';
import { note, type Noted, type WayOut } from './note.ts';
import type { PortionCount } from './portions.ts';
import { cakeOfProposal } from './propose-cakes.ts';
import { cuttingCakeOf, sheetsFor } from './propose-cutting.ts';
import { wornCoat, type ResolvedDesign } from './resolve-design.ts';
import { cuttingWords } from './sentences.ts';
import { supportsOf } from './supports.ts';
import { tierName } from './tier-name.ts';

/** Whether the cake feeds everybody, can be baked and stands up. */
export function cakeAdvice(
  resolved: ResolvedDesign,
  portions: PortionCount,
  proposals: readonly Proposal[],
): Noted[] {
  const { cake } = resolved.design;
  return [
    ...portionAdvice(resolved, portions, proposals),
    ...(cake === null || cake.kind !== 'tiered'
      ? []
      : [...sizeAdvice(cake, resolved.menu), ...stepAdvice(cake, resolved.menu)]),
    ...dummyAdvice(resolved),
    ...supportAdvice(resolved),
  ];
}

function portionAdvice(
  resolved: ResolvedDesign,
  { wanted, fed }: PortionCount,
  proposals: readonly Proposal[],
): Noted[] {
  const { cake } = resolved.design;
  if (cake === null) {
    if (proposals.length > 0) return [];
    return [
      note({
        code: 'portions',
        level: 'care',
        step: 'cake',
        about: 'portions',
        sentence: `Nothing we bake feeds ${wanted}.`,
        instead: 'Please write to us: we would find a way to feed them.',
      }),
    ];
  }
  const ways = proposals.map((it) => ({
    label: `${it.name}, ${it.portions} portions`,
    patch: { cake: cakeOfProposal(it, wornCoat(cake)) },
  }));
  if (fed < wanted) {
    const rest = restWays(resolved, cake, wanted - fed);
    return [
      note({
        code: 'portions',
        level: 'care',
        step: 'cake',
        about: 'portions',
        sentence: `This feeds ${fed} of the ${wanted} you want to feed.`,
        instead:
          rest.length + ways.length === 0
            ? 'A cutting cake from the kitchen would feed the rest.'
            : 'These would do.',
        ways: [...rest, ...ways],
      }),
    ];
  }
  if (fed <= wanted * (1 + resolved.menu.kitchen.plentyPpm / 1e6) || fed - wanted < 10) return [];
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

/** This cake as it is, and cutting cakes in the kitchen for those it does not feed. */
function restWays(
  { tiers, menu, portionSize }: ResolvedDesign,
  cake: Cake,
  missing: number,
): WayOut[] {
  const cut = sheetsFor(missing, menu, portionSize);
  const inside = tiers.find((it) => it.real);
  if (cut === null || inside === undefined || cake.cuttingCakes.length > 0) return [];
  const added = cuttingCakeOf(cut.size, cut.count, {
    spongeId: inside.sponge?.id ?? null,
    fillingId: inside.filling?.id ?? null,
  });
  return [
    {
      label: `This cake, with ${cuttingWords(cut.count)} in the kitchen`,
      patch: { cake: { ...cake, cuttingCakes: [added] } },
    },
  ];
}

const fits = (size: TierSize, { shape, widthMm, depthMm }: Tier): boolean =>
  size.shape === shape &&
  ((size.widthMm === widthMm && size.depthMm === depthMm) ||
    (size.widthMm === depthMm && size.depthMm === widthMm));

/** The studio bakes what its tins, oven, fridge and boxes allow. */
function sizeAdvice(cake: Cake, menu: Menu): Noted[] {
  const lead = menu.studio.lengthLead;
  return cake.tiers.flatMap((tier, index): Noted[] => {
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
      plain: `No tin for it: tier ${index + 1} from the board, ${measures}.`,
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

function stepAdvice(cake: Cake, menu: Menu): Noted[] {
  const lead = menu.studio.lengthLead;
  const { smallestStepMm } = menu.kitchen;
  return cake.tiers.flatMap((tier, index): Noted[] => {
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
        ways: overhangs ? sortedWays(cake) : [],
        talk: overhangs,
      }),
    ];
  });
}

/** The widest tier at the bottom, where that makes every tier stand on the one under it. */
function sortedWays(cake: Cake): WayOut[] {
  const tiers = cake.tiers.toSorted((a, b) => b.widthMm * b.depthMm - a.widthMm * a.depthMm);
  const stands = tiers.every((tier, at) => {
    const below = tiers[at - 1];
    return below === undefined || (tier.widthMm <= below.widthMm && tier.depthMm <= below.depthMm);
  });
  return stands ? [{ label: 'Widest at the bottom', patch: { cake: { ...cake, tiers } } }] : [];
}

/** A dummy is for show; whoever cuts the cake has to know which tiers are one. */
function dummyAdvice({ tiers }: ResolvedDesign): Noted[] {
  const dummies = tiers.filter((it) => !it.real);
  if (dummies.length === 0) return [];
  const names = dummies.map((it) => tierName(it.index, tiers.length).toLowerCase());
  return [
    note({
      code: 'supports',
      level: 'ok',
      step: 'cake',
      about: 'dummies',
      sentence:
        dummies.length === tiers.length
          ? 'The cake on show is a dummy: nothing of it is cut or eaten.'
          : `For show, not for eating: ${formatList(names)}.`,
      instead: 'Show whoever cuts the cake.',
    }),
  ];
}

function supportAdvice({ tiers, menu }: ResolvedDesign): Noted[] {
  const { boards, dowels } = supportsOf(tiers, menu.kitchen);
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
