import type { Declaration, Tier } from '#shared/contracts/design.ts';
import type { Menu } from '#shared/contracts/menu.ts';
import { allergenId } from '#shared/contracts/vocabulary.ts';
import type { OrderForm } from '../draft/empty-order.ts';
import { coatOf } from './choose-coat.ts';

/** About 8 in and 4 in high: a start that the head count soon puts another in place of. */
const startAcrossMm = 203;
const startHeightMm = 102;

/**
 * The form begun with the cake and the table that a link speaks of (`paths.orderWith`); null where
 * it speaks of none, or of what the menu does not have any more.
 */
export function startWith(fragment: string, values: OrderForm, menu: Menu): OrderForm | null {
  const asked = new URLSearchParams(fragment.replace(/^#/, ''));
  const find = <Item extends { readonly id: string }>(items: readonly Item[], name: string) =>
    items.find(({ id }) => id === asked.get(name));
  const sponge = find(menu.sponges, 'sponge');
  const filling = find(menu.fillings, 'filling');
  const covering = find(menu.coverings, 'covering');
  const style = find(menu.styles, 'style') ?? null;
  if (sponge === undefined || filling === undefined || covering === undefined) return null;
  if ((covering.id === 'ganache') !== (style === null)) return null;
  const tier = startTier(menu, sponge.id, filling.id);
  if (tier === null) return null;
  const warmest = Number(asked.get('warmest') ?? Number.NaN);
  return {
    ...values,
    day: { ...values.day, allergies: withAllergy(values.day.allergies, asked) },
    cake: {
      kind: 'tiered',
      tiers: [tier],
      sheet: null,
      coating: coatOf(
        { covering: covering.id, style: style === null ? null : style.id },
        values.cake.coating,
        menu,
      ),
      cuttingCakes: [],
    },
    setting: Number.isFinite(warmest) ? { ...values.setting, warmestC: warmest } : values.setting,
  };
}

function startTier(menu: Menu, spongeId: string, fillingId: string): Tier | null {
  const off = (across: number) => Math.abs(across - startAcrossMm);
  const [size] = menu.tierSizes
    .filter((it) => it.shape === 'round')
    .toSorted((a, b) => off(a.widthMm) - off(b.widthMm));
  if (size === undefined) return null;
  const [heightMm = startHeightMm] = size.heightsMm.toSorted(
    (a, b) => Math.abs(a - startHeightMm) - Math.abs(b - startHeightMm),
  );
  return {
    shape: 'round',
    widthMm: size.widthMm,
    depthMm: size.depthMm,
    heightMm,
    layers: 3,
    real: true,
    keepsake: false,
    spongeId,
    fillingId,
    coating: null,
  };
}

/** The allergy the link speaks of, unless it is declared already; how grave it is is asked there. */
function withAllergy(declared: readonly Declaration[], asked: URLSearchParams): Declaration[] {
  const allergen = allergenId.safeParse(asked.get('allergen'));
  const species = asked.get('species');
  if (!allergen.success) return [...declared];
  const known = declared.some((it) => it.allergen === allergen.data && it.species === species);
  if (known) return [...declared];
  return [
    ...declared,
    { allergen: allergen.data, species, text: '', severity: 'allergy', guests: 1 },
  ];
}
