import { formatMoney } from '#shared/kitchen/money.ts';
import type { PriceBookContent } from '#shared/contracts/prices.ts';
import { CakeDrawing } from '#web/components/cake-drawing/cake-drawing.tsx';
import { sampleCakes } from '#web/components/sample-cakes/sample-cakes.ts';
import { Fold } from '#web/components/ui/fold.tsx';
import { VisuallyHidden } from '#web/components/ui/visually-hidden.tsx';
import { changesBetween } from '../draft/book-in-words.ts';
import { priceOfSample } from '../draft/price-of-sample.ts';
import { usePriceDraft } from '../draft/price-draft.ts';

type Props = {
  /** The book as it would be saved; null while something in it cannot be read. */
  readonly next: PriceBookContent | null;
  readonly today: string;
};

/** Three cakes by the book in force and by the one being written, and what differs. */
export function WhatChanges({ next, today }: Props) {
  const { prices, menu } = usePriceDraft();
  const { locale } = menu.studio;
  const now = prices.content;
  const changes = next === null ? [] : changesBetween(now, next, prices, menu);
  return (
    <div className="grid gap-5">
      <ul className="grid divide-y divide-seam">
        {sampleCakes(menu).map((sample) => {
          const before = priceOfSample(sample, now, { menu, prices, today });
          const after = next === null ? null : priceOfSample(sample, next, { menu, prices, today });
          return (
            <li key={sample.id} className="grid grid-cols-[5rem_1fr] items-center gap-4 py-3">
              <CakeDrawing
                cake={sample.design.cake}
                look={sample.design.look}
                menu={menu}
                size="small"
                trimmed
                className="max-h-20"
              />
              <div className="grid gap-0.5">
                <p className="text-sm text-slate">{sample.name}</p>
                <p className="flex flex-wrap items-baseline gap-x-2 font-display text-lg font-semibold tabular-nums">
                  {after === before ? (
                    formatMoney(before, now.currency, locale)
                  ) : (
                    <>
                      <s className="font-sans text-base font-normal text-slate">
                        <VisuallyHidden>now </VisuallyHidden>
                        {formatMoney(before, now.currency, locale)}
                      </s>
                      <span>
                        <VisuallyHidden>would be </VisuallyHidden>
                        {after === null || next === null
                          ? '…'
                          : formatMoney(after, next.currency, locale)}
                      </span>
                    </>
                  )}
                </p>
              </div>
            </li>
          );
        })}
      </ul>
      <div role="status">
        {next === null ? (
          <p>Some figures cannot be read yet.</p>
        ) : changes.length === 0 ? (
          <p className="text-slate">Nothing has changed yet.</p>
        ) : (
          <p className="font-semibold">
            {changes.length === 1 ? 'One price differs.' : `${changes.length} prices differ.`}
          </p>
        )}
      </div>
      {changes.length > 0 && (
        <Fold label="What differs">
          <ul className="grid gap-2 text-sm">
            {changes.map(({ name, before, after }) => (
              <li key={name} className="flex flex-wrap justify-between gap-x-4">
                <span>{name}</span>
                <span className="tabular-nums">
                  <s className="text-slate">
                    <VisuallyHidden>was </VisuallyHidden>
                    {before ?? 'none'}
                  </s>{' '}
                  <span aria-hidden="true">→</span>
                  <VisuallyHidden> becomes </VisuallyHidden> {after ?? 'none'}
                </span>
              </li>
            ))}
          </ul>
        </Fold>
      )}
    </div>
  );
}
