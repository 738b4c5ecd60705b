import type { Advice } from '#shared/contracts/estimates.ts';
import type { CalendarView } from '#shared/contracts/staff.ts';
import { isAboutGuests } from '#shared/kitchen/about-guests.ts';
import { canMove } from '#api/modules/orders/change-order-status.command.ts';
import { pickupOf } from '#api/modules/orders/pickup.queries.ts';
import { mayStaffDo } from '#api/modules/staff-orders/may-staff.queries.ts';
import type { Actor } from '#api/platform/actor.ts';
import type { Calendar } from './calendar.queries.ts';

/** The staff's calendar. */
export function presentCalendar(calendar: Calendar, actor: Actor): CalendarView {
  return {
    today: calendar.today,
    days: calendar.days,
    lanes: calendar.lanes.map(({ order, revision, customer, summary, tasks, allergies }) => ({
      number: order.number,
      customer,
      summary,
      status: order.status,
      pickup: pickupOf(order, revision),
      tasks,
      allergies,
      can: {
        ready: mayStaffDo(actor, 'ready') && canMove(order, 'ready', actor),
        collect: mayStaffDo(actor, 'collect') && canMove(order, 'collect', actor),
        start: mayStaffDo(actor, 'start') && canMove(order, 'start', actor),
      },
      rowVersion: order.rowVersion,
    })),
    waiting: calendar.waiting.map(({ order, revision, customer, summary, advice, fits }) => ({
      number: order.number,
      rowVersion: order.rowVersion,
      customer,
      summary,
      pickup: pickupOf(order, revision),
      advice: overviewOf(advice, actor),
      fits,
      totalMinor: revision.totalMinor,
      currency: revision.currency,
      can: {
        confirm:
          mayStaffDo(actor, 'confirm') &&
          canMove(order, 'confirm', actor) &&
          advice?.level !== 'stop',
        decline: mayStaffDo(actor, 'decline') && canMove(order, 'decline', actor),
      },
    })),
    can: { blockDays: mayStaffDo(actor, 'block-days') },
  };
}

/**
 * The calendar hangs where everybody passes: whoever does not settle what guests told reads only
 * that there is something.
 */
function overviewOf(advice: Advice | null, actor: Actor): Advice | null {
  if (advice === null || !isAboutGuests(advice) || mayStaffDo(actor, 'answer-allergy')) {
    return advice;
  }
  const sentence = 'Something about who will eat it is to be settled first.';
  return { ...advice, about: 'guests', sentence, plain: sentence, instead: '', ways: [] };
}
