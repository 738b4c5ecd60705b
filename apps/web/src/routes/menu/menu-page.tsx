import { useState } from 'react';
import { Link } from 'react-router-dom';
import { byLevel } from '#shared/kitchen/heat.ts';
import { formatMoney } from '#shared/kitchen/money.ts';
import { DecorationGlyph } from '#web/components/cake-drawing/decoration-glyph.tsx';
import { LinkButton } from '#web/components/ui/link-button.tsx';
import { PageTitle } from '#web/components/ui/page-title.tsx';
import { Rim } from '#web/components/ui/rim.tsx';
import { Section } from '#web/components/ui/section.tsx';
import { paths } from '#web/config/paths.ts';
import { useMenu } from '#web/features/menu/api/get-menu.ts';
import { contentsToSay } from '#web/features/order-wizard/design/contains.ts';
import { CoatComparison } from './coat-comparison.tsx';
import {
  judgeContents,
  judgeDecoration,
  judgeFilling,
  noWish,
  type Verdict,
  type Wish,
} from './judge-part.ts';
import { MenuWish } from './menu-wish.tsx';
import { WholeCakes } from './whole-cakes.tsx';
import { ColourSpoon, PartRow } from './part-row.tsx';
import { SizeTable } from './size-table.tsx';

const per = { piece: 'each', tier: 'a tier', cake: 'a cake' } as const;

/** Parts with how each suits the table, those that fall away last; else in the studio's own order. */
function judged<Part extends { readonly id: string }>(
  parts: readonly Part[],
  judge: (part: Part) => Verdict,
) {
  return parts
    .map((part) => ({ ...part, verdict: judge(part) }))
    .sort((a, b) => byLevel(a.verdict.level, b.verdict.level));
}

/** Everything the studio makes, what is in it and what it costs. */
export function MenuPage() {
  const menu = useMenu();
  const { locale, currency, labelRegion } = menu.studio;
  const money = (minor: number) => formatMoney(minor, currency, locale);
  const extraCost = (minor: number) => (minor === 0 ? undefined : `+ ${money(minor)} a portion`);
  const [asked, setAsked] = useState(noWish);
  const unread = asked.warmestC !== null && Number.isNaN(asked.warmestC);
  const wish: Wish = unread ? { ...asked, warmestC: null } : asked;
  const prices = menu.priceBook.tierBands.map((it) => it.perPortionMinor);
  return (
    <div className="page grid gap-14 py-8">
      <header className="grid gap-3">
        <PageTitle title="Menu" />
        <p className="measure text-lg">
          Tiered cakes from {money(Math.min(...prices))} a portion, sheets from{' '}
          {money(menu.priceBook.sheetPerPortionMinor)}; no order under{' '}
          {money(menu.priceBook.minimumMinor)}. What each thing contains is worked out from its
          ingredients.{' '}
          <Link to={paths.care} className="link">
            About allergies and our kitchen
          </Link>
        </p>
      </header>

      <Rim label="Buttercreams side by side" className="grid gap-5 p-4 sm:p-8">
        <h2>Six buttercreams, side by side</h2>
        <MenuWish menu={menu} wish={asked} onWish={setAsked} />
        {(wish.allergen !== null || wish.warmestC !== null) && (
          <WholeCakes menu={menu} wish={wish} />
        )}
        <CoatComparison menu={menu} wish={wish} />
      </Rim>

      <div className="grid gap-x-14 gap-y-14 md:grid-cols-2">
        <Section title="Sponges">
          <ul className="grid">
            {judged(menu.sponges, (it) => judgeContents(it.contents, wish, menu)).map((it) => (
              <PartRow
                key={it.id}
                {...it}
                region={labelRegion}
                price={extraCost(it.surchargePerPortionMinor)}
                picture={<ColourSpoon colour={it.colour} />}
              />
            ))}
          </ul>
        </Section>
        <Section title="Fillings">
          <ul className="grid">
            {judged(menu.fillings, (it) => judgeFilling(it, wish, menu)).map((it) => (
              <PartRow
                key={it.id}
                {...it}
                region={labelRegion}
                price={extraCost(it.surchargePerPortionMinor)}
                picture={<ColourSpoon colour={it.colour} />}
              />
            ))}
          </ul>
        </Section>
      </div>

      <Section title="How many it feeds">
        <p className="measure text-slate">
          By our own cutting plan, at full height.{' '}
          {menu.portionSizes.map((it) => `${it.name}: ${it.blurb}`).join(' ')}
        </p>
        <SizeTable menu={menu} />
      </Section>

      <Section title="Decorations">
        <ul className="grid gap-x-14 md:grid-cols-2">
          {judged(menu.decorations, (it) => judgeDecoration(it, wish, menu)).map((it) => (
            <PartRow
              verdict={it.verdict}
              key={it.id}
              name={it.name}
              blurb={it.blurb}
              caution={it.caution}
              contents={contentsToSay(it)}
              region={labelRegion}
              price={`${money(it.priceMinor)} ${per[it.per]}`}
              picture={<DecorationGlyph glyph={it.glyph} className="size-10" />}
            />
          ))}
        </ul>
      </Section>

      {menu.extras.length > 0 && (
        <Section title="Beside the cake">
          <ul className="grid gap-x-14 md:grid-cols-2">
            {menu.extras.map((it) => (
              <li key={it.id} className="flex justify-between gap-6 border-b border-seam py-3">
                <span>
                  <strong>{it.name}.</strong> {it.blurb}
                </span>
                <span className="shrink-0 tabular-nums">{money(it.priceMinor)}</span>
              </li>
            ))}
          </ul>
        </Section>
      )}

      <div>
        <LinkButton to={paths.order}>Order a cake</LinkButton>
      </div>
    </div>
  );
}
