import type { Menu } from '#shared/contracts/menu.ts';
import type { Coating, Tier } from '#shared/contracts/design.ts';
import type { OrderForm } from '../draft/empty-order.ts';

export type Fitted = {
  readonly values: OrderForm;
  /** What is no longer on the menu, in words for the customer. */
  readonly gone: readonly string[];
};

/**
 * A draft may be older than the menu: whatever the studio no longer offers is taken out of it and
 * named, so that nothing is priced or sent that cannot be made.
 */
export function fitToMenu(values: OrderForm, menu: Menu): Fitted {
  const gone = new Set<string>();
  const has = (list: readonly { readonly id: string }[], id: string | null, what: string) => {
    if (id === null || list.some((it) => it.id === id)) return true;
    gone.add(what);
    return false;
  };
  const coat = (it: Coating | null): Coating | null =>
    it !== null &&
    has(menu.coverings, it.covering, 'the covering you chose') &&
    has(menu.styles, it.style, 'the buttercream you chose')
      ? it
      : null;
  const tier = (it: Tier): Tier => ({
    ...it,
    spongeId: has(menu.sponges, it.spongeId, 'a sponge you chose') ? it.spongeId : null,
    fillingId: has(menu.fillings, it.fillingId, 'a filling you chose') ? it.fillingId : null,
    coating: coat(it.coating),
  });
  const { sheet } = values.cake;
  const fitted: OrderForm = {
    ...values,
    day: {
      ...values.day,
      occasionId:
        values.day.occasionId === '' || has(menu.occasions, values.day.occasionId, 'the occasion')
          ? values.day.occasionId
          : '',
    },
    cake: {
      ...values.cake,
      tiers: values.cake.tiers.map(tier),
      sheet:
        sheet === null || !has(menu.sheetSizes, sheet.sizeId, 'the size of the sheet')
          ? null
          : {
              ...sheet,
              spongeId: has(menu.sponges, sheet.spongeId, 'a sponge you chose')
                ? sheet.spongeId
                : null,
              fillingId: has(menu.fillings, sheet.fillingId, 'a filling you chose')
                ? sheet.fillingId
                : null,
            },
      coating: coat(values.cake.coating),
      cuttingCakes: values.cake.cuttingCakes
        .filter((it) => has(menu.sheetSizes, it.sizeId, 'the size of a cutting cake'))
        .map((it) => ({
          ...it,
          spongeId: has(menu.sponges, it.spongeId, 'a sponge you chose') ? it.spongeId : null,
          fillingId: has(menu.fillings, it.fillingId, 'a filling you chose') ? it.fillingId : null,
        })),
    },
    look: {
      ...values.look,
      decorations: values.look.decorations.filter((it) =>
        has(menu.decorations, it.decorationId, 'a decoration you chose'),
      ),
    },
    extras: values.extras.filter((it) => has(menu.extras, it.extraId, 'an extra you chose')),
  };
  return { values: gone.size === 0 ? values : fitted, gone: [...gone] };
}
