import type { CardPaper } from '#shared/contracts/cards.ts';
import { warmthOf } from '#shared/kitchen/heat.ts';
import { keepCoolOf } from '#shared/kitchen/time-out.ts';
import { notFound } from '#api/platform/app-error.ts';
import type { CardSource } from './label-source.queries.ts';
import { careCardPdf } from './pdf/care-card-pdf.ts';

/** The care card as a PDF; on half a Letter in the US, on A5 elsewhere, unless asked otherwise. */
export async function printCareCard(
  source: CardSource,
  options: { readonly paper: CardPaper | undefined; readonly publicUrl: string },
): Promise<Buffer> {
  const { order, label, resolved, pickup, estimate, design, menu } = source;
  if (label === null) throw notFound('There is no cake in this order.');
  const { setting } = design;
  const fridge =
    setting === null ? null : keepCoolOf(setting, warmthOf(setting, menu, pickup.date).celsius);
  const usual = menu.studio.labelRegion === 'US' ? 'half-letter' : 'a5';
  return careCardPdf(
    {
      number: order.number,
      resolved,
      label,
      pickup,
      fridgeUntil: fridge?.until ?? null,
      keepCool: estimate.keepCool,
      url: `${options.publicUrl}/cake/${order.careCode ?? ''}`,
    },
    options.paper ?? usual,
  );
}
