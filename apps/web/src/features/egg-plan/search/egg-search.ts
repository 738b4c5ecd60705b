import { eggSize, type EggSizeName } from '#shared/contracts/kitchen-sheet.ts';
import { eggKeeping } from '#shared/kitchen/eggs/plan-eggs.ts';
import { readSpan, type Span } from './span.ts';

/** What the plan of eggs is asked with. */
export type EggSearch = Span & {
  readonly size: EggSizeName;
  readonly whiteDays: number;
  readonly yolkDays: number;
};

/** As the address says it, with the usual where it says nothing. */
export function readEggSearch(params: URLSearchParams, today: string): EggSearch {
  const size = eggSize.safeParse(params.get('size'));
  return {
    ...readSpan(params, today),
    size: size.success ? size.data : 'large',
    whiteDays: keptDays(params.get('whites'), eggKeeping.whiteDays),
    yolkDays: keptDays(params.get('yolks'), eggKeeping.yolkDays),
  };
}

export function writeEggSearch({ from, to, size, whiteDays, yolkDays }: EggSearch): string {
  const params = new URLSearchParams({ from, to });
  if (size !== 'large') params.set('size', size);
  if (whiteDays !== eggKeeping.whiteDays) params.set('whites', String(whiteDays));
  if (yolkDays !== eggKeeping.yolkDays) params.set('yolks', String(yolkDays));
  return params.toString();
}

function keptDays(text: string | null, usual: number): number {
  const days = Number(text);
  const { leastDays, mostDays } = eggKeeping;
  return text !== null && Number.isInteger(days) && days >= leastDays && days <= mostDays
    ? days
    : usual;
}
