import { addDays, addMonths, today } from '#shared/dates/local-time.ts';
import type { LocalDate, UtcMinute } from '#shared/dates/local-time.ts';
import { openBook } from '#shared/dates/answer-dates.ts';
import type { DateAnswers, OpenBook } from '#shared/dates/answer-dates.ts';
import type { Supply } from '#shared/dates/model.ts';
import { currentClock, currentDatabase } from '#api/db/current-database.ts';
import type { Database } from '#api/db/database.ts';
import { Studio } from '#api/db/models/studio.ts';
import { readPlanVersions } from '#api/db/plan-versions.ts';
import type { PlanVersions } from '#api/db/plan-versions.ts';
import { loadStanding } from './load-standing.ts';
import { loadSupply } from './load-supply.ts';
import { loadPlanSettings } from './plan-settings.ts';
import type { PlanSettings } from './plan-settings.ts';

/** The order book as it stood at one version of the plan, ready to be asked. */
export type KeptBook = {
  readonly versions: PlanVersions;
  readonly open: OpenBook;
  readonly settings: PlanSettings;
  readonly until: LocalDate;
  /** Answers already given from this book, by what was asked. */
  readonly answers: Map<string, DateAnswers>;
};

type Kept = { readonly database: Database; readonly mark: UtcMinute; readonly book: KeptBook };

/**
 * Planning looks from the next mark of ten minutes on, so that a book is good until then: it may
 * offer a few minutes too few of the running shift, never one that is gone.
 */
const markMinutes = 10;

/** How far a book looks at least, and in what steps further. */
const stepDays = 130;

/** Nobody plans further ahead than this, however the book is set. */
const mostMonths = 60;

let kept: Kept | null = null;
let opening: Promise<KeptBook> | null = null;
let openingFor = '';

/** The first minute work may still be put into. */
export function planningNow(now: Date): UtcMinute {
  return Math.ceil(now.getTime() / 60_000 / markMinutes) * markMinutes;
}

/**
 * The book as it is now, up to a day at least; kept until plan, hours or menu change or its ten
 * minutes are over. Many who ask at once wait for the same one.
 */
export async function currentBook(wanted: LocalDate): Promise<KeptBook> {
  const until = await reachFor(wanted);
  const versions = await readPlanVersions();
  const mark = planningNow(currentClock().now());
  if (kept !== null && isGood(kept, versions, mark, until)) return kept.book;
  const question = `${versions.planVersion} ${versions.settingsVersion} ${mark} ${until}`;
  if (opening === null || openingFor !== question) {
    openingFor = question;
    const mine = openAt(mark, until).finally(() => {
      if (opening === mine) opening = null;
    });
    opening = mine;
  }
  return opening;
}

function isGood(it: Kept, versions: PlanVersions, mark: UtcMinute, until: LocalDate): boolean {
  return (
    it.database === currentDatabase() &&
    it.mark === mark &&
    it.book.until >= until &&
    it.book.versions.planVersion === versions.planVersion &&
    it.book.versions.settingsVersion === versions.settingsVersion &&
    it.book.versions.catalogueVersion === versions.catalogueVersion
  );
}

/** The day it is, and the last day customers may ask for. */
export async function bookLimits(): Promise<{
  readonly today: LocalDate;
  readonly openUntil: LocalDate;
}> {
  const { zone, bookOpenMonths } = await Studio.findByPk(1, { rejectOnEmpty: true });
  const day = today(currentClock().now(), zone);
  return { today: day, openUntil: addMonths(day, Math.min(bookOpenMonths, mostMonths)) };
}

/** As far as a book can look for a day: a little at least, and never beyond its limit. */
async function reachFor(wanted: LocalDate): Promise<LocalDate> {
  const { today: day } = await bookLimits();
  const limit = addMonths(day, mostMonths);
  let until = addDays(day, stepDays);
  while (until < wanted && until < limit) until = addDays(until, stepDays);
  return until;
}

/** Reads everything at one version: what changes while it is read is read again. */
async function openAt(mark: UtcMinute, until: LocalDate): Promise<KeptBook> {
  const database = currentDatabase();
  for (;;) {
    const versions = await readPlanVersions();
    const { supply, settings } = await groundAt(versions, mark, until);
    const standing = await loadStanding(supply);
    const after = await readPlanVersions();
    if (
      after.planVersion !== versions.planVersion ||
      after.settingsVersion !== versions.settingsVersion
    ) {
      continue;
    }
    const book = {
      versions,
      open: openBook(supply, standing),
      settings,
      until,
      answers: new Map(),
    };
    kept = { database, mark, book };
    return book;
  }
}

/**
 * Hours and times change only with the settings: writing work into a shift writes the shift down
 * as the week has it.
 */
async function groundAt(
  versions: PlanVersions,
  mark: UtcMinute,
  until: LocalDate,
): Promise<{ readonly supply: Supply; readonly settings: PlanSettings }> {
  if (
    kept !== null &&
    kept.database === currentDatabase() &&
    kept.mark === mark &&
    kept.book.until === until &&
    kept.book.versions.settingsVersion === versions.settingsVersion &&
    kept.book.versions.catalogueVersion === versions.catalogueVersion
  ) {
    return { supply: kept.book.open.supply, settings: kept.book.settings };
  }
  const [supply, settings] = await Promise.all([loadSupply(mark, until), loadPlanSettings()]);
  return { supply, settings };
}
