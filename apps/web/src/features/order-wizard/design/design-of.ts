import type { Design } from '#shared/contracts/design.ts';
import type { OrderStep } from '#web/config/paths.ts';
import type { OrderForm } from '../draft/empty-order.ts';
import { stepIndex } from '../steps/steps.ts';
import { orderToSend } from './tidy-order.ts';

/** As many cutting cakes of one kind as the contract takes. */
const mostOfOneKind = 100;

/** A number that can be worked with, or the one to use until it can be read. */
function known(value: number, otherwise: number): number {
  return Number.isFinite(value) ? Math.round(value) : otherwise;
}

/**
 * The design as the pure rules and the API take it, or null before there is a head count and an
 * occasion. Answers that cannot be read yet stand at a harmless value, so that the drawing and the
 * estimate stay while somebody types. The setting counts from when it has been asked.
 */
export function designOf(values: OrderForm, reached: OrderStep): Design | null {
  const { date: _date, windowStart: _windowStart, ...guests } = values.day;
  const headCount = known(guests.headCount, 0);
  if (headCount < 1 || headCount > 2000 || guests.occasionId === '') return null;
  const order = orderToSend(values, null);
  const hasCake =
    order.cake.kind === 'sheet' ? order.cake.sheet !== null : order.cake.tiers.length > 0;
  const asked = stepIndex(reached) >= stepIndex('setting');
  return {
    guests: {
      ...guests,
      headCount,
      allergies: guests.allergies
        .filter((it) => it.allergen !== null || it.text.trim() !== '')
        .map((it) => ({ ...it, guests: Math.max(1, known(it.guests, 1)) })),
    },
    cake: hasCake
      ? {
          ...order.cake,
          cuttingCakes: order.cake.cuttingCakes.map((it) => ({
            ...it,
            count: Math.min(mostOfOneKind, Math.max(1, known(it.count, 1))),
          })),
        }
      : null,
    setting: asked
      ? {
          ...order.setting,
          warmestC:
            order.setting.warmestC === null || Number.isNaN(order.setting.warmestC)
              ? null
              : order.setting.warmestC,
          minutesOut: known(order.setting.minutesOut, 0),
          driveMinutes: known(order.setting.driveMinutes, 0),
          servedAt:
            order.setting.servedAt === null || Number.isNaN(order.setting.servedAt)
              ? null
              : order.setting.servedAt,
        }
      : null,
    look: {
      ...order.look,
      decorations: order.look.decorations.map((it) => ({
        ...it,
        quantity: Math.max(1, known(it.quantity, 1)),
      })),
    },
    extras: order.extras.map((it) => ({ ...it, quantity: Math.max(1, known(it.quantity, 1)) })),
  };
}
