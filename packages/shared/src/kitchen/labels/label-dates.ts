import { localAt } from '#shared/dates/local-time.ts';
import type { LocalDate } from '#shared/dates/local-time.ts';

/** A finished part with the moment it was made and how long it keeps chilled. */
export type KeptPart = {
  readonly name: string;
  readonly madeAt: Date;
  /** Null where the formula does not tell. */
  readonly keepsChilledHours: number | null;
};

export type UseBy = {
  /** The day on which the first part stops keeping; null while some part does not tell. */
  readonly date: LocalDate | null;
  readonly at: Date | null;
  /** Which part that is; empty where there is none. */
  readonly because: string;
  /** Parts whose formula tells no shelf life. */
  readonly untold: readonly string[];
};

const hourMs = 3_600_000;

/** How long the whole keeps: no longer than the part that keeps shortest, from when that was made. */
export function useByOf(parts: readonly KeptPart[], zone: string): UseBy {
  const untold = parts.filter((it) => it.keepsChilledHours === null).map((it) => it.name);
  const ends = parts
    .flatMap(({ name, madeAt, keepsChilledHours }) =>
      keepsChilledHours === null
        ? []
        : [{ name, ms: madeAt.getTime() + keepsChilledHours * hourMs }],
    )
    .sort((a, b) => a.ms - b.ms);
  const [first] = ends;
  if (first === undefined || untold.length > 0)
    return { date: null, at: null, because: '', untold };
  const at = new Date(first.ms);
  return { date: localAt(at, zone).date, at, because: first.name, untold };
}
