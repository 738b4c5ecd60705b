import type { LocalDate } from '#shared/dates/local-time.ts';

/** The picker counts in `Date`s of this device's own midnight; a day of ours is a plain text. */
export function toPickerDate(date: LocalDate): Date {
  const [year = 1970, month = 1, day = 1] = date.split('-').map(Number);
  return new Date(year, month - 1, day);
}

export function fromPickerDate(date: Date): LocalDate {
  const two = (figure: number) => String(figure).padStart(2, '0');
  return `${date.getFullYear()}-${two(date.getMonth() + 1)}-${two(date.getDate())}`;
}

/** The first and last day of a month. */
export function monthRange(date: LocalDate): { readonly from: LocalDate; readonly to: LocalDate } {
  const first = toPickerDate(date);
  return {
    from: `${date.slice(0, 7)}-01`,
    to: fromPickerDate(new Date(first.getFullYear(), first.getMonth() + 1, 0)),
  };
}
