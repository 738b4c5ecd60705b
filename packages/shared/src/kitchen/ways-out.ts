import type { Cake, Coating } from '#shared/contracts/design.ts';
import type { Advice } from '#shared/contracts/estimates.ts';
import type { Contents, Filling, Sponge } from '#shared/contracts/menu.ts';
import { formatList } from '#shared/dates/format.ts';
import { coatingName, type ResolvedCoating } from './resolve-design.ts';
import { named } from './sentences.ts';
import type { Coat, Situation } from './situation.ts';

export type Way = Advice['ways'][number];

type Clashes = (contents: Contents) => boolean;

/** How many ways are offered at once; more would be a menu again. */
const mostWays = 3;

/** The same coat in another covering or style; the finish stays where the new one has it. */
function recoat(old: Coating, { covering, style }: Coat): Coating {
  return {
    covering: covering.id,
    style: style?.id ?? null,
    finish: covering.finishes.includes(old.finish)
      ? old.finish
      : (covering.finishes[0] ?? old.finish),
    colour: old.colour,
  };
}

const sameCoat = (a: Coating, b: Coat | ResolvedCoating): boolean =>
  a.covering === b.covering.id && a.style === (b.style?.id ?? null);

/** A cake whose offending coats, the whole cake's or single tiers', are replaced by one other. */
export function withCoat(cake: Cake, offends: (coating: Coating) => boolean, choice: Coat): Cake {
  const change = (it: Coating | null) => (it !== null && offends(it) ? recoat(it, choice) : it);
  return {
    ...cake,
    coating: change(cake.coating),
    tiers: cake.tiers.map((it) => ({ ...it, coating: change(it.coating) })),
  };
}

/** Ways to another coat than `coat`: the best ranked that are not themselves a stop. */
export function otherCoats(
  situation: Situation,
  coat: ResolvedCoating,
  suits: (choice: Coat) => boolean = () => true,
): Way[] {
  const { resolved, coats } = situation;
  const { cake } = resolved.design;
  if (cake === null) return [];
  const offered = coats.filter(
    (it) =>
      it.rank.level !== 'stop' &&
      !(it.covering.id === coat.covering.id && it.style?.id === coat.style?.id) &&
      suits(it),
  );
  // Another style of the same covering changes least; then one choice of every other covering.
  const same = offered.filter((it) => it.covering.id === coat.covering.id).slice(0, 2);
  const others = [...new Set(offered.map((it) => it.covering.id))]
    .filter((id) => id !== coat.covering.id && id !== 'semi-naked')
    .flatMap((id) => {
      const ofCovering = offered.filter((it) => it.covering.id === id);
      return ofCovering.find((it) => it.style?.id === coat.style?.id) ?? ofCovering[0] ?? [];
    });
  return [...same, ...others].slice(0, mostWays).map((choice) => ({
    label: coatingName(choice),
    patch: { cake: withCoat(cake, (it) => sameCoat(it, coat), choice) },
  }));
}

/**
 * Whole cakes that do without what clashes: every offending sponge, filling and coat replaced and
 * every offending decoration left out, in one press. First those that suit all guests at once;
 * empty where the menu has no such cake.
 */
export function waysWithout(situation: Situation, clashes: Clashes): Way[] {
  const guests = situation.clashesWithGuests;
  const forAll = waysFor(situation, (it) => clashes(it) || guests(it));
  return forAll.length > 0 ? forAll : waysFor(situation, clashes);
}

function waysFor(situation: Situation, clashes: Clashes): Way[] {
  const { resolved, parts } = situation;
  const { menu, design } = resolved;
  const { cake, look } = design;
  if (cake === null) return [];
  const offending = parts.filter((it) => it.unread || clashes(it.contents));
  const kinds = new Set(offending.map((it) => it.kind));
  const badIds = (kind: 'sponge' | 'filling') =>
    new Set(offending.filter((it) => it.kind === kind).map((it) => it.id));
  const badSponges = badIds('sponge');
  const badFillings = badIds('filling');
  const badDecorations = new Set(
    offending.filter((it) => it.kind === 'decoration').map((it) => it.id),
  );

  const sponges = menu.sponges.filter((it) => !clashes(it.contents));
  const fillings = menu.fillings.filter((it) => !clashes(it.contents));
  const coats = coatsWithout(situation, clashes);
  const badCoat = (it: Coating) => !coats.some((choice) => sameCoat(it, choice));
  const needsCoat = kinds.has('buttercream') || kinds.has('covering');

  const pick = <Item>(items: readonly Item[], nth: number) =>
    items[Math.min(nth, items.length - 1)];
  const ways = new Map<string, Way>();
  for (let nth = 0; nth < mostWays; nth += 1) {
    const sponge = kinds.has('sponge') ? pick(sponges, nth) : null;
    const filling = kinds.has('filling') ? pick(fillings, nth) : null;
    const coat = needsCoat ? pick(coats, nth) : null;
    if (sponge === undefined || filling === undefined || coat === undefined) return [];
    const names = [
      ...(sponge === null ? [] : [named(sponge.name, 'sponge')]),
      ...(filling === null ? [] : [named(filling.name, 'filling')]),
      ...(coat === null ? [] : [coatingName(coat)]),
    ];
    const left = offending.filter((it) => it.kind === 'decoration').map((it) => it.name);
    const without = left.length === 0 ? '' : `without ${formatList(left)}`;
    const label = [formatList(names), without].filter((it) => it !== '').join(', ');
    if (label === '') return [];
    ways.set(label, {
      label: names.length === 0 ? `Leave out ${formatList(left)}` : label,
      patch: {
        ...(names.length === 0
          ? {}
          : { cake: remade(cake, { sponge, filling, coat, badSponges, badFillings, badCoat }) }),
        ...(look === null || badDecorations.size === 0
          ? {}
          : {
              look: {
                ...look,
                decorations: look.decorations.filter((it) => !badDecorations.has(it.decorationId)),
              },
            }),
      },
    });
  }
  return [...ways.values()];
}

/** Coats whose covering and style both do without; those that hold in the setting come first. */
function coatsWithout({ resolved, warmth, coats }: Situation, clashes: Clashes): Coat[] {
  const current = resolved.tiers.find((it) => it.coating !== null)?.coating?.covering.id;
  const clean = coats.filter(
    (it) => !clashes(it.covering.contents) && !(it.style !== null && clashes(it.style.contents)),
  );
  const holding = warmth === null ? clean : clean.filter((it) => it.rank.level !== 'stop');
  const usable = holding.length > 0 ? holding : clean;
  return [
    ...usable.filter((it) => it.covering.id === current),
    ...usable.filter((it) => it.covering.id !== current),
  ];
}

function remade(
  cake: Cake,
  change: {
    readonly sponge: Sponge | null;
    readonly filling: Filling | null;
    readonly coat: Coat | null;
    readonly badSponges: ReadonlySet<string>;
    readonly badFillings: ReadonlySet<string>;
    readonly badCoat: (coating: Coating) => boolean;
  },
): Cake {
  const { sponge, filling, coat, badSponges, badFillings, badCoat } = change;
  const refill = <Inside extends { spongeId: string | null; fillingId: string | null }>(
    it: Inside,
  ): Inside => ({
    ...it,
    spongeId:
      sponge !== null && it.spongeId !== null && badSponges.has(it.spongeId)
        ? sponge.id
        : it.spongeId,
    fillingId:
      filling !== null && it.fillingId !== null && badFillings.has(it.fillingId)
        ? filling.id
        : it.fillingId,
  });
  const changed: Cake = {
    ...cake,
    tiers: cake.tiers.map(refill),
    sheet: cake.sheet === null ? null : refill(cake.sheet),
  };
  return coat === null ? changed : withCoat(changed, badCoat, coat);
}

/** Ways to another filling for the tiers that `offends` points at. */
export function otherFillings(
  situation: Situation,
  filling: Filling,
  suits: (filling: Filling) => boolean,
): Way[] {
  const { design, menu } = situation.resolved;
  const { cake } = design;
  if (cake === null) return [];
  const guests = situation.clashesWithGuests;
  return menu.fillings
    .filter((it) => it.id !== filling.id && suits(it) && !guests(it.contents))
    .slice(0, mostWays)
    .map((choice) => ({
      label: named(choice.name, 'filling'),
      patch: {
        cake: remade(cake, {
          sponge: null,
          filling: choice,
          coat: null,
          badSponges: new Set(),
          badFillings: new Set([filling.id]),
          badCoat: () => false,
        }),
      },
    }));
}
