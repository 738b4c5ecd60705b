import type { Cake, Coating, Setting } from '#shared/contracts/design.ts';
import type { Contents, Filling, Sponge } from '#shared/contracts/menu.ts';
import type { AdviceLevel } from '#shared/contracts/vocabulary.ts';
import { formatList } from '#shared/dates/format.ts';
import { detailOf, fineness, finestOn } from './detail.ts';
import { coatLimitC } from './heat.ts';
import type { WayOut } from './note.ts';
import type { Part } from './parts.ts';
import { coatingName } from './resolve-design.ts';
import { named } from './sentences.ts';
import type { Coat, RankedCoat, Situation } from './situation.ts';
import { mostWays, movedIndoors, sameCoat, withCoat, withInside } from './ways-out.ts';

type Clashes = (contents: Contents) => boolean;

/** What a whole cake could be made of, best first. */
export type Makings = {
  readonly sponges: readonly Sponge[];
  readonly fillings: readonly Filling[];
  readonly coats: readonly RankedCoat[];
};

/**
 * Sponges, fillings and coats that none of it speaks against, best first for the place: what holds
 * there, then what carries the work on it, then as the menu and the ranks have them.
 */
export function makingsWithout(situation: Situation, clashes: Clashes): Makings {
  const { resolved, coats } = situation;
  const { menu } = resolved;
  const finest = finestOn(resolved, resolved.tiers);
  const worn = resolved.tiers.find((it) => it.coating !== null)?.coating ?? null;
  const clean = coats.filter(
    (it) => !clashes(it.covering.contents) && !(it.style !== null && clashes(it.style.contents)),
  );
  const rank = (it: RankedCoat) =>
    [
      it.heat === 'stop' ? 1 : 0,
      fineness[detailOf(it)] >= finest ? 0 : 1,
      it.covering.id === worn?.covering.id ? 0 : 1,
      it.style?.id === worn?.style?.id ? 0 : 1,
    ] as const;
  return {
    sponges: menu.sponges.filter((it) => !clashes(it.contents)),
    fillings: sortBy(
      menu.fillings.filter((it) => !clashes(it.contents)),
      (it) => [fareOfFilling(it, situation) === 'ok' ? 0 : 1],
    ).filter((it, _, all) => {
      // One that would slide under another tier is offered only where all would.
      const slides = (one: Filling) => fareOfFilling(one, situation) === 'stop';
      return !slides(it) || all.every(slides);
    }),
    coats: sortBy(clean, rank),
  };
}

/** How a filling fares where it would stand: warmth is `care`, and `stop` where it would slide. */
export function fareOfFilling(
  { soft, holdsToC }: Pick<Filling, 'soft' | 'holdsToC'>,
  { resolved, warmth }: Pick<Situation, 'resolved' | 'warmth'>,
): AdviceLevel {
  if (warmth === null || warmth.celsius <= holdsToC) return 'ok';
  return soft && resolved.tiers.length > 1 ? 'stop' : 'care';
}

function sortBy<Item>(
  items: readonly Item[],
  keyOf: (item: Item) => readonly number[],
): readonly Item[] {
  return items
    .map((item) => ({ item, key: keyOf(item) }))
    .sort((a, b) => a.key.map((it, at) => it - (b.key[at] ?? 0)).find((it) => it !== 0) ?? 0)
    .map(({ item }) => item);
}

/**
 * Whole cakes that do without what clashes: every offending sponge, filling and coat replaced
 * wherever in the cake it is, every offending decoration left out, and whatever would not hold on
 * that day replaced too, in one press. First those that suit all guests at once; else those that
 * bring nothing to the table that was not on it before. Empty where the menu has no such cake.
 */
export function waysWithout(situation: Situation, clashes: Clashes): WayOut[] {
  const { parts, guestClashes } = situation;
  const forAll = waysFor(situation, (it) => clashes(it) || guestClashes(it).length > 0);
  if (forAll.length > 0) return forAll;
  const before = new Set(parts.flatMap((it) => guestClashes(it.contents)));
  // What is there already and has to go is not asked of the menu twice.
  return waysFor(
    situation,
    (it) => clashes(it) || guestClashes(it).some((one) => !before.has(one)),
  );
}

function waysFor(situation: Situation, clashes: Clashes): WayOut[] {
  const { resolved, parts } = situation;
  const { cake, look } = resolved.design;
  if (cake === null) return [];
  const offending = parts.filter((it) => it.unread || clashes(it.contents));
  const makings = makingsWithout(situation, clashes);
  const bad = idsOf(offending, situation);
  const melting = meltingCoats(situation);
  const needsCoat =
    offending.some((it) => it.kind === 'buttercream' || it.kind === 'covering') ||
    (melting.length > 0 && makings.coats.some((it) => it.heat !== 'stop'));
  const needs = { sponge: bad.sponges.size > 0, filling: bad.fillings.size > 0, coat: needsCoat };
  const left = offending.filter((it) => it.kind === 'decoration').map((it) => it.name);
  const badDecorations = new Set(
    offending.filter((it) => it.kind === 'decoration').map((it) => it.id),
  );
  const patchOfLook =
    look === null || badDecorations.size === 0
      ? {}
      : {
          look: {
            ...look,
            decorations: look.decorations.filter((it) => !badDecorations.has(it.decorationId)),
          },
        };
  const onlySheets = cake.tiers.length === 0;
  const pick = <Item>(items: readonly Item[], nth: number) =>
    items[Math.min(nth, items.length - 1)];
  const ways = new Map<string, WayOut>();
  for (let nth = 0; nth < mostWays; nth += 1) {
    const sponge = needs.sponge ? pick(makings.sponges, nth) : null;
    // A sheet may go without a filling; a tier may not.
    const filling = needs.filling
      ? (pick(makings.fillings, nth) ?? (onlySheets ? noFilling : undefined))
      : null;
    const coat = needs.coat ? pick(makings.coats, nth) : null;
    if (sponge === undefined || filling === undefined || coat === undefined) return [];
    const room = coolerRoom(coat === null ? melting : [coat], situation);
    const label = labelOf({ sponge, filling, coat, left, room });
    if (label === '') return [];
    const remake = sponge !== null || filling !== null || coat !== null;
    ways.set(label, {
      label,
      patch: {
        ...(remake
          ? { cake: remade(cake, { sponge, filling, coat, bad, clashes, situation }) }
          : {}),
        ...patchOfLook,
        ...(room === null ? {} : { setting: room }),
      },
    });
  }
  return [...ways.values()];
}

const noFilling = 'none';
type NewFilling = Filling | typeof noFilling | null;

type Bad = { readonly sponges: ReadonlySet<string>; readonly fillings: ReadonlySet<string> };

/** Ids of the sponges and fillings that have to go: for what is in them, or because they slide. */
function idsOf(offending: readonly Part[], situation: Situation): Bad {
  const ids = (kind: Part['kind']) => offending.filter((it) => it.kind === kind).map((it) => it.id);
  const { tiers } = situation.resolved;
  const sliding = tiers.flatMap(({ filling, index }) =>
    filling !== null && index < tiers.length - 1 && fareOfFilling(filling, situation) === 'stop'
      ? [filling.id]
      : [],
  );
  return { sponges: new Set(ids('sponge')), fillings: new Set([...ids('filling'), ...sliding]) };
}

/** Coats of the cake that would not hold where it stands. */
function meltingCoats({ resolved, coats }: Situation): readonly RankedCoat[] {
  const worn = resolved.tiers.flatMap(({ coating }) => coating ?? []);
  return coats.filter(
    (it) =>
      it.heat === 'stop' &&
      worn.some((one) => one.covering.id === it.covering.id && one.style?.id === it.style?.id),
  );
}

/** Where even the best coat would not hold, the cake stays inside until it is cut. */
function coolerRoom(coats: readonly RankedCoat[], situation: Situation): Setting | null {
  const limits = coats.filter((it) => it.heat === 'stop').map(coatLimitC);
  return limits.length === 0 ? null : movedIndoors(situation, Math.min(...limits));
}

type Choice = {
  readonly sponge: Sponge | null;
  readonly filling: NewFilling;
  readonly coat: Coat | null;
};

function labelOf({
  sponge,
  filling,
  coat,
  left,
  room,
}: Choice & { readonly left: readonly string[]; readonly room: Setting | null }): string {
  const names = [
    ...(sponge === null ? [] : [named(sponge.name, 'sponge')]),
    ...(filling === null
      ? []
      : [filling === noFilling ? 'no filling' : named(filling.name, 'filling')]),
    ...(coat === null ? [] : [coatingName(coat)]),
  ];
  if (names.length === 0) return left.length === 0 ? '' : `Leave out ${formatList(left)}`;
  return [
    formatList(names),
    ...(left.length === 0 ? [] : [`without ${formatList(left)}`]),
    ...(room === null ? [] : ['inside until cutting']),
  ].join(', ');
}

function remade(
  cake: Cake,
  {
    sponge,
    filling,
    coat,
    bad,
    clashes,
    situation,
  }: Choice & {
    readonly bad: Bad;
    readonly clashes: Clashes;
    readonly situation: Situation;
  },
): Cake {
  const changed = withInside(cake, (it, of) => ({
    spongeId:
      sponge !== null && it.spongeId !== null && bad.sponges.has(it.spongeId)
        ? sponge.id
        : it.spongeId,
    fillingId:
      filling !== null && it.fillingId !== null && bad.fillings.has(it.fillingId)
        ? filling === noFilling
          ? of === 'sheet'
            ? null
            : it.fillingId
          : filling.id
        : it.fillingId,
  }));
  if (coat === null) return changed;
  const melting = meltingCoats(situation);
  const badCoat = (it: Coating) => {
    const onMenu = situation.coats.find((one) => sameCoat(it, one));
    return (
      onMenu === undefined ||
      clashes(onMenu.covering.contents) ||
      (onMenu.style !== null && clashes(onMenu.style.contents)) ||
      melting.includes(onMenu)
    );
  };
  return withCoat(changed, badCoat, coat);
}
