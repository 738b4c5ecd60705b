import type { DateAnswer, DateReason, DayAnswer, PickupWindow } from '#shared/contracts/dates.ts';
import { Book } from './book.ts';
import { checkAddition, checkLaterWindow, gatherStanding } from './check-plan.ts';
import type { Standing } from './check-plan.ts';
import { fitsSomewhere } from './cold.ts';
import { formatDay, formatWeekday } from './format.ts';
import { addDays, datesInRange } from './local-time.ts';
import type { LocalDate } from './local-time.ts';
import type { Demand, PlannedOrder, Supply, Window } from './model.ts';
import type { Fault } from './plan-fault.ts';
import { placeWork, readyDemand } from './place-work.ts';
import type { ReadyDemand } from './place-work.ts';
import { findShortage } from './relax-work.ts';

/** A book made ready for many questions; use it for one design after the other. */
export type OpenBook = {
  readonly supply: Supply;
  readonly book: Book;
  readonly standing: Standing;
};

export function openBook(supply: Supply, orders: readonly PlannedOrder[]): OpenBook {
  return { supply, book: new Book(supply, orders), standing: gatherStanding(supply, orders) };
}

export type DateAnswers = {
  readonly days: DayAnswer[];
  /** Plans the checker refused: mistakes of the planner, to be logged. Never empty quietly. */
  readonly faults: readonly Fault[];
};

/** The order that is asked about, before it has an id. */
const asked = 'asked';

/** Answers every day of a range for one design; the heart of `POST /api/dates`. */
export function answerDates(
  open: OpenBook,
  demand: Demand,
  from: LocalDate,
  to: LocalDate,
): DateAnswers {
  const question = new Question(open, readyDemand(demand));
  return {
    days: datesInRange(from, to).map((date) => question.answerDay(date)),
    faults: question.faults,
  };
}

/** One day's window with the plan behind it, for whoever stores it. */
export type WindowPlan = {
  readonly answer: Exclude<DateAnswer, 'checking'>;
  readonly reason: DateReason | null;
  readonly window: Window | null;
  readonly order: PlannedOrder | null;
  readonly faults: readonly Fault[];
};

/** Plans one order for one window. The plan, where there is one, has passed the checker. */
export function planWindow(
  open: OpenBook,
  demand: Demand,
  pickup: { readonly date: LocalDate; readonly startMinute: number },
  orderId: string,
): WindowPlan {
  const question = new Question(open, readyDemand(demand), orderId);
  const window =
    open.supply.windows.get(pickup.date)?.find((it) => it.startMinute === pickup.startMinute) ??
    null;
  const closed = question.refuseDay(pickup.date);
  if (closed !== null || window === null) {
    const reason = closed ?? closedDay(pickup.date);
    return { answer: 'closed', reason, window, order: null, faults: question.faults };
  }
  if (!open.book.hasHandover(window)) {
    return { answer: 'closed', reason: windowFull(), window, order: null, faults: question.faults };
  }
  const order = question.plan(window, null);
  if (order !== null)
    return { answer: 'open', reason: null, window, order, faults: question.faults };
  const reason = question.shortageAt(window);
  return {
    answer: reason === null ? 'ask-us' : 'closed',
    reason,
    window,
    order: null,
    faults: question.faults,
  };
}

class Question {
  readonly faults: Fault[] = [];
  private readonly open: OpenBook;
  private readonly ready: ReadyDemand;
  private readonly orderId: string;
  private readonly earliest: LocalDate;
  private readonly tooBig: boolean;

  constructor(open: OpenBook, ready: ReadyDemand, orderId = asked) {
    this.open = open;
    this.ready = ready;
    this.orderId = orderId;
    const { supply } = open;
    this.earliest = firstPickupDay(supply, addDays(supply.today, ready.demand.noticeDays));
    const { cold } = supply;
    const longest = supply.shifts.reduce((most, it) => Math.max(most, it.endAt - it.startAt), 0);
    this.tooBig =
      (cold !== null && ready.demand.boxes.some((box) => !fitsSomewhere(cold, box))) ||
      (longest > 0 && ready.demand.work.some((work) => work.minutes > longest));
  }

  answerDay(date: LocalDate): DayAnswer {
    const { supply, book } = this.open;
    const windows = supply.windows.get(date) ?? [];
    const fill = Math.round(book.fillOf(date) * 100) / 100;
    const refused = this.refuseDay(date);
    if (refused !== null)
      return {
        date,
        answer: 'closed',
        reason: refused,
        fill,
        windows: windows.map((it) => told(it, 'closed')),
      };
    const free = windows.filter((it) => book.hasHandover(it));
    if (free.length === 0) {
      return {
        date,
        answer: 'closed',
        reason: windowFull(),
        fill,
        windows: windows.map((it) => told(it, 'closed')),
      };
    }
    const plans = new Map<Window, PlannedOrder>();
    let last: PlannedOrder | null = null;
    for (const window of free) {
      const order = this.plan(window, last);
      if (order === null) continue;
      plans.set(window, order);
      last = order;
    }
    // A window is answered for itself, as sending an order for it would be.
    const shortages = new Map(
      free.filter((it) => !plans.has(it)).map((it) => [it, this.shortageAt(it)]),
    );
    const undecided = (it: Window): boolean => shortages.get(it) === null;
    if (last === null) {
      const reason = free.some(undecided) ? null : ([...shortages.values()].at(-1) ?? null);
      return {
        date,
        answer: reason === null ? 'ask-us' : 'closed',
        reason,
        fill,
        windows: windows.map((it) => told(it, undecided(it) ? 'ask-us' : 'closed')),
      };
    }
    const answer = this.takesAnother([...plans.values()]) ? 'open' : 'last-place';
    return {
      date,
      answer,
      reason: null,
      fill,
      windows: windows.map((it) =>
        told(it, plans.has(it) ? answer : undecided(it) ? 'ask-us' : 'closed'),
      ),
    };
  }

  /** Why nothing can be handed over that day, whatever the window; null when it may be. */
  refuseDay(date: LocalDate): DateReason | null {
    const { supply, book } = this.open;
    if (date < supply.today || date < this.earliest) return tooSoon(this.earliest);
    if (date > supply.bookOpenUntil) return tooFar(supply.bookOpenUntil);
    if (!supply.windows.has(date)) return closedDay(date);
    if (this.tooBig)
      return reasonOf(
        'too-big',
        'That is larger than our fridge and our shifts can hold; please write to us.',
      );
    const refusal = book.refusesDay(date, this.ready.demand.occasionId);
    if (refusal === null) return null;
    return {
      ...reasonOf(
        'full',
        refusal.kind === 'cap'
          ? 'We take no more of these on that day.'
          : 'The handovers of that day are taken.',
      ),
      resource: 'orders',
      day: date,
    };
  }

  /** A plan for the window that the checker has passed; that of an earlier one that day first. */
  plan(window: Window, earlier: PlannedOrder | null): PlannedOrder | null {
    if (earlier !== null) {
      const same = { ...earlier, pickup: window };
      if (checkLaterWindow(this.open.standing, same).length === 0) return same;
    }
    const placement = placeWork(this.open.book, this.ready, window, this.orderId);
    if (!placement.found) return null;
    const faults = checkAddition(this.open.standing, placement.order);
    this.faults.push(...faults);
    return faults.length === 0 ? placement.order : null;
  }

  /** Why no plan at all exists for a window; null where one still may. */
  shortageAt(window: Window): DateReason | null {
    const { supply, standing } = this.open;
    const shortage = findShortage(supply, standing.orders, this.ready.demand, window);
    if (shortage === null) return null;
    const { resource, day } = shortage;
    return {
      ...reasonOf('full', `${sentenceOf(resource)} up to ${formatDay(day)}.`),
      resource,
      day,
    };
  }

  /** A hint: whether a second cake like it finds a place beside the first. */
  private takesAnother(plans: readonly PlannedOrder[]): boolean {
    const { book } = this.open;
    const first = plans.at(-1);
    if (first === undefined) return false;
    book.put(first);
    const another = plans
      .toReversed()
      .some((plan) => placeWork(book, this.ready, plan.pickup, `${this.orderId} again`).found);
    book.takeBack(first);
    return another;
  }
}

function told(window: Window, answer: DateAnswer): PickupWindow {
  return { start: window.startMinute, minutes: window.minutes, answer };
}

/** The first day with pickups from a day on, or that day where none is known. */
function firstPickupDay(supply: Supply, from: LocalDate): LocalDate {
  for (let n = 0; n < 60; n += 1) {
    const date = addDays(from, n);
    if (supply.windows.has(date)) return date;
  }
  return from;
}

function reasonOf(code: DateReason['code'], sentence: string): DateReason {
  return { code, sentence, earliest: null, resource: null, day: null };
}

const closedDay = (date: LocalDate): DateReason =>
  reasonOf(
    'closed-day',
    `No pickups on ${formatWeekday(date)} ${formatDay(date, { weekday: false })}.`,
  );

const windowFull = (): DateReason =>
  reasonOf('window-full', 'All pickup times of that day are taken.');

const tooFar = (until: LocalDate): DateReason =>
  reasonOf('too-far', `Our book is open until ${formatDay(until, { year: true })}.`);

const tooSoon = (earliest: LocalDate): DateReason => ({
  ...reasonOf('too-soon', `This cake needs more time: ${formatDay(earliest)} is the earliest.`),
  earliest,
});

function sentenceOf(resource: string): string {
  if (resource === 'bench') return 'The bench is full';
  if (resource === 'mixer') return 'The mixer is taken';
  if (resource === 'oven') return 'The oven is full';
  return 'The hands for that work are taken';
}
