import type { AllergenId, TaskKind } from '#shared/contracts/vocabulary.ts';
import type { LocalDate, UtcMinute } from './local-time.ts';

/**
 * The planning model: what a studio can do, what an order needs, and a plan that gives every
 * piece of work its time. All amounts are whole minutes, grams and millimetres; capacities are
 * rounded down before they come here.
 */

export type Worker = {
  readonly id: string;
  readonly name: string;
  readonly skills: readonly string[];
};

/** A stretch of one day with named people at the bench. */
export type Shift = {
  /** Day and start, the same whether or not the shift is written down yet. */
  readonly key: string;
  readonly date: LocalDate;
  readonly startMinute: number;
  readonly endMinute: number;
  readonly startAt: UtcMinute;
  readonly endAt: UtcMinute;
  /** First minute still to be had: its start, or the present in the running shift. */
  readonly opensAt: UtcMinute;
  readonly people: readonly Worker[];
  /** People x remaining length x utilisation. */
  readonly benchMinutes: number;
  /** The same for the whole shift; how full a day is, is told of this. */
  readonly wholeBenchMinutes: number;
  /** Mixers x remaining length, decks x remaining length. */
  readonly mixerMinutes: number;
  readonly ovenMinutes: number;
  readonly mixers: number;
  readonly decks: number;
  /** Bench minutes of those who have a skill, by skill. */
  readonly skillMinutes: ReadonlyMap<string, number>;
};

export type Window = {
  readonly date: LocalDate;
  readonly startMinute: number;
  readonly minutes: number;
  readonly startAt: UtcMinute;
  readonly endAt: UtcMinute;
  readonly handovers: number;
};

/** So many orders a day at most; null means any. */
export type DayCap = {
  readonly occasionId: string | null;
  /** ISO 8601: Monday is 1. */
  readonly weekday: number | null;
  readonly date: LocalDate | null;
  readonly maxOrders: number;
};

/** What a cake or a tier takes of a fridge, on its board. */
export type Box = { readonly widthMm: number; readonly depthMm: number; readonly heightMm: number };

export type ColdPlace = Box & { readonly places: number };

export type Supply = {
  readonly now: UtcMinute;
  readonly today: LocalDate;
  readonly zone: string;
  /** In order of time; days that are closed and shifts that are over are not in it. */
  readonly shifts: readonly Shift[];
  /** By day, in order of start; days without any are closed for pickups. */
  readonly windows: ReadonlyMap<LocalDate, readonly Window[]>;
  readonly caps: readonly DayCap[];
  /** Handovers of a day that are kept back for regulars. */
  readonly keptBack: number;
  readonly bookOpenUntil: LocalDate;
  /** Null where the studio does not count its fridge. */
  readonly cold: readonly ColdPlace[] | null;
};

/** Which formula a batch is made by, told by the part of the menu it is for. */
export type BatchSource = {
  readonly part: 'sponge' | 'filling' | 'style' | 'covering' | 'custard';
  /** The sponge's, filling's, style's or covering's id; of a custard, the style's it goes into. */
  readonly id: string;
};

export type BatchPart = {
  readonly source: BatchSource;
  readonly grams: number;
  /** Bowls or oven loads. */
  readonly bowls: number;
};

/** One piece of work: a task on the order, or the order's own batch of a formula. */
export type Work = {
  /** Unique within the order. */
  readonly key: string;
  readonly kind: TaskKind;
  readonly label: string;
  /** From the board up; null where it is about the whole cake. */
  readonly tier: number | null;
  /** From its start to its end on the clock. */
  readonly minutes: number;
  /** Hands on it, from its start; never more than `minutes`. */
  readonly benchMinutes: number;
  /** From its start. */
  readonly mixerMinutes: number;
  /** Deck-minutes; the oven follows the hands. */
  readonly ovenMinutes: number;
  readonly skill: string | null;
  readonly batch: BatchPart | null;
  /** It starts at most so long before the pickup window's end, because it keeps no longer. */
  readonly within: number | null;
};

/** start(after) >= end(before) + gap, and <= end(before) + keeps where that is given. */
export type Link = {
  readonly before: string;
  readonly after: string;
  readonly gap: number;
  /** Shelf life of what `before` makes. */
  readonly keeps: number | null;
};

export type Demand = {
  readonly occasionId: string;
  readonly noticeDays: number;
  readonly work: readonly Work[];
  readonly links: readonly Link[];
  /** Cold places it takes every night from its fill to its pickup. */
  readonly boxes: readonly Box[];
  readonly contains: readonly AllergenId[];
  /** Allergens its work is kept apart from. */
  readonly apart: readonly AllergenId[];
};

/** When and for which window the cake is handed over. */
export type PickupTime = Pick<Window, 'date' | 'startMinute' | 'startAt' | 'endAt'>;

/** The time the plan gives one piece of work. */
export type Place = {
  readonly key: string;
  readonly shiftKey: string;
  readonly startAt: UtcMinute;
};

/** An order's whole place in the plan. Finished work is no longer in it. */
export type PlannedOrder = {
  readonly orderId: string;
  readonly demand: Demand;
  readonly pickup: PickupTime;
  readonly places: readonly Place[];
  /** The first night it stands in the cold; null before its fill has a day. */
  readonly coldFrom: LocalDate | null;
  /** The first night it is gone again: its pickup day, or later while nobody has collected it. */
  readonly coldUntil: LocalDate;
};

/** Why a day or a window cannot be had, as the planner says it. */
export type Refusal =
  | { readonly kind: 'window-full' }
  | { readonly kind: 'cap' }
  | { readonly kind: 'kept-back' }
  /** The planner found no room for this piece; another planner might. */
  | { readonly kind: 'no-place'; readonly work: Work };

export type Placement =
  | { readonly found: true; readonly order: PlannedOrder }
  | { readonly found: false; readonly refusal: Refusal };

/** Work that makes something cold-kept of the cake: from here on it stands in the fridge. */
export const coldStartsWith: TaskKind = 'fill-and-crumb-coat';
