import type { KitchenSheet } from '#shared/contracts/kitchen-sheet.ts';
import { Notice } from '#web/components/ui/notice.tsx';
import { gramsText } from '#web/lib/grams-text.ts';

type Props = { readonly unknown: KitchenSheet['unknown']; readonly locale: string };

/** What no formula tells of: named, so that nobody takes the rest for the whole. */
export function UnknownNeeds({ unknown, locale }: Props) {
  if (unknown.length === 0) return null;
  return (
    <Notice tone="butter" title="Not all of it can be worked out">
      <ul className="grid gap-1">
        {unknown.map((it, at) => (
          <li key={`${at} ${it.name}`}>
            {it.name}, {gramsText(it.grams, locale)}:{' '}
            {it.message === ''
              ? 'no formula is kept for it, so what goes into it is missing here.'
              : it.message}
          </li>
        ))}
      </ul>
    </Notice>
  );
}
