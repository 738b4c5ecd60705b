import type { CakeCare, LabelReason, OrderLabels } from '#shared/contracts/cards.ts';
import { formatLength } from '#shared/kitchen/measures.ts';
import { allergenLabel, isMajorAllergen } from '#shared/kitchen/allergen-names.ts';
import { containedAllergens, partsOf } from '#shared/kitchen/parts.ts';
import type { Actor } from '#api/platform/actor.ts';
import { careCodeOf } from './care-code.queries.ts';
import { hasCare, mayCard, type CardResource } from './cards.policy.ts';
import { confirmable, fingerprintOf } from './confirm-unknown.command.ts';
import type { CardSource } from './label-source.queries.ts';

/** What stops the labels of an order, with its own state; what the owner answered for does not. */
export function stopsOf({ order, reasons }: CardSource): {
  readonly reasons: LabelReason[];
  readonly unknownConfirmed: boolean;
} {
  const unknownConfirmed =
    confirmable(reasons).length > 0 && order.unknownConfirmed === fingerprintOf(reasons);
  const standing = unknownConfirmed ? reasons.filter((it) => !it.confirmable) : reasons;
  const early: LabelReason[] = hasCare(order.status)
    ? []
    : [
        {
          code: 'not-confirmed',
          sentence: 'Labels and care card are for a cake that is confirmed.',
          ingredientId: null,
          formulaId: null,
          confirmable: false,
        },
      ];
  return { reasons: [...early, ...standing], unknownConfirmed };
}

export function resourceOf({ order }: Pick<CardSource, 'order'>): CardResource {
  return { id: order.id, customerId: order.customerUserId, status: order.status };
}

/** What will be printed, what keeps it from being printed, and who may do what about it. */
export function presentLabels(source: CardSource, actor: Actor): OrderLabels {
  const { order, labels, reminders, design } = source;
  const { reasons, unknownConfirmed } = stopsOf(source);
  const may = (action: Parameters<typeof mayCard>[1]) => mayCard(actor, action, resourceOf(source));
  return {
    labels: [...labels],
    reasons,
    reminders: [...reminders],
    unknownConfirmed,
    careCode: careCodeOf(order),
    servedAt: design.setting?.servedAt ?? null,
    can: {
      printLabels: may('print-labels') && reasons.length === 0,
      printCareCard: may('see-care-card') && hasCare(order.status) && labels.length > 0,
      confirmUnknown: may('confirm-unknown') && reasons.some((it) => it.confirmable),
    },
  };
}

/**
 * The cake alone, for whoever holds its code: nothing that somebody typed about themselves, so
 * neither the words on the cake nor the notes.
 */
export function presentCare(source: CardSource): CakeCare | null {
  const { label, menu, resolved, design, estimate, pickup } = source;
  if (label === null) return null;
  const parts = partsOf(resolved);
  const { labelRegion: region, lengthLead } = menu.studio;
  const { portionSize } = resolved;
  return {
    product: label.product,
    cake: design.cake,
    look: design.look === null ? null : { ...design.look, words: [], note: '' },
    portionSizeId: portionSize.id,
    portions: {
      fed: estimate.portions.fed,
      perTier: estimate.portions.perTier,
      each: `${formatLength(portionSize.widthMm, lengthLead)} by ${formatLength(portionSize.depthMm, lengthLead)}`,
    },
    label,
    parts: parts.map((it) => ({
      name: it.name,
      statement: it.contents.statement,
      contains: it.contents.allergens
        .filter((entry) => entry.state === 'contains')
        .map((entry) => allergenLabel(entry, region)),
    })),
    handled: estimate.handled,
    alsoIn: containedAllergens(parts)
      .filter((it) => it.state === 'contains' && !isMajorAllergen(it, region))
      .map((it) => ({ allergen: it.allergen, text: allergenLabel(it, region) })),
    keepCool: estimate.keepCool,
    pickupOn: pickup.date,
  };
}
