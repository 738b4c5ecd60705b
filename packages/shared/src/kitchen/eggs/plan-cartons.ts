import { addDays, type LocalDate } from '#shared/dates/local-time.ts';
import { coverDays } from './cover-days.ts';

/** Liquid pasteurised egg: 10 days unopened, 3 opened (FDA, refrigerator storage chart). */
export const cartonKeeping = { unopenedDays: 10, openedDays: 3 } as const;

export type CartonNeed = { readonly date: LocalDate; readonly grams: number };

export type CartonPlan = {
  readonly cartons: number;
  readonly days: readonly {
    readonly date: LocalDate;
    readonly open: number;
    /** Not bought before: unopened it would not keep. */
    readonly boughtFrom: LocalDate;
    readonly useBy: LocalDate;
  }[];
  /** What is left over in all, grams. */
  readonly leftG: number;
};

/** The fewest cartons to open for all needs, each used up within its days. `packG` above nothing. */
export function planCartons(
  needs: readonly CartonNeed[],
  packG: number,
  openedDays: number = cartonKeeping.openedDays,
): CartonPlan {
  const mg = (grams: number) => Math.ceil(Math.round(grams * 1_000_000) / 1000);
  const opened = coverDays([
    {
      demands: needs.map(({ date, grams }) => ({ date, amount: mg(grams) })),
      perUnit: Math.max(1, Math.round(packG * 1000)),
      keepsDays: openedDays,
    },
  ]);
  const days = [...opened].map(([date, open]) => ({
    date,
    open,
    boughtFrom: addDays(date, -cartonKeeping.unopenedDays),
    useBy: addDays(date, openedDays),
  }));
  const cartons = days.reduce((sum, it) => sum + it.open, 0);
  const usedG = needs.reduce((sum, it) => sum + it.grams, 0);
  return { cartons, days, leftG: Math.max(0, cartons * packG - usedG) };
}
