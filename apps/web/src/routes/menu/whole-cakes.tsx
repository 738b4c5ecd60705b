import { Link } from 'react-router-dom';
import type { Menu } from '#shared/contracts/menu.ts';
import { formatList } from '#shared/dates/format.ts';
import { formatTemperature } from '#shared/kitchen/measures.ts';
import { coatingName } from '#shared/kitchen/resolve-design.ts';
import { named } from '#shared/kitchen/sentences.ts';
import { CoatSwatch } from '#web/components/coats/coat-swatch.tsx';
import { Notice } from '#web/components/ui/notice.tsx';
import { paths } from '#web/config/paths.ts';
import { type Wish, wishName } from './judge-part.ts';
import { wholeCakesFor, type WholeCake } from './whole-cakes-for.ts';

type Props = { readonly menu: Menu; readonly wish: Wish };

/** Whole cakes for the table that was described, each with its way into the order. */
export function WholeCakes({ menu, wish }: Props) {
  const { temperatureLead, handles } = menu.studio;
  const { allergen, warmestC } = wish;
  const without = allergen === null ? '' : ` that contain no ${wishName(wish, menu)}`;
  const holding =
    warmestC === null ? '' : ` that hold at ${formatTemperature(warmestC, temperatureLead)}`;
  const cakes = wholeCakesFor(wish, menu);
  const handled = handles.some((it) => it.allergen === allergen);
  return (
    <section aria-labelledby="whole-cakes" className="grid gap-4">
      <h3 id="whole-cakes">
        Whole cakes{without}
        {without !== '' && holding !== '' ? ' and' : ''}
        {holding}
      </h3>
      {cakes.length === 0 ? (
        <p>
          Our menu has none. Ask us before you give up: tell us about it in the order, and a baker
          answers.
        </p>
      ) : (
        <ul className="grid gap-x-8 sm:grid-cols-2 xl:grid-cols-3">
          {cakes.map((cake) => (
            <CakeLine key={nameOf(cake)} cake={cake} menu={menu} wish={wish} />
          ))}
        </ul>
      )}
      {allergen !== null && (
        <Notice tone="butter">
          <p>
            By what the labels of our ingredients say.{' '}
            {handled && `Our kitchen handles ${wishName(wish, menu)}, and traces can travel. `}
            Declare the allergy in the order: a baker answers before anything is promised.
          </p>
        </Notice>
      )}
    </section>
  );
}

const nameOf = ({ sponge, filling, coat }: WholeCake): string =>
  formatList([named(sponge.name, 'sponge'), named(filling.name, 'filling'), coatingName(coat)]);

function CakeLine({
  cake,
  menu,
  wish,
}: {
  readonly cake: WholeCake;
  readonly menu: Menu;
  readonly wish: Wish;
}) {
  const { sponge, filling, coat } = cake;
  const { allergen, species, warmestC } = wish;
  const to = paths.orderWith({
    sponge: sponge.id,
    filling: filling.id,
    covering: coat.covering.id,
    ...(coat.style === null ? {} : { style: coat.style.id }),
    ...(allergen === null ? {} : { allergen }),
    ...(species === null ? {} : { species }),
    ...(warmestC === null ? {} : { warmest: warmestC.toFixed(1) }),
  });
  return (
    <li className="border-b border-seam">
      <Link
        to={to}
        className="grid grid-cols-[4.5rem_1fr] items-center gap-4 py-3 no-underline hover:bg-cloud"
      >
        <CoatSwatch
          menu={menu}
          covering={coat.covering.id}
          style={coat.style?.id ?? null}
          className="w-18"
        />
        <span className="grid gap-0.5">
          <span className="font-semibold text-cobalt underline underline-offset-3">
            {coatingName(coat)}
          </span>
          <span className="text-sm">
            on {named(sponge.name, 'sponge').toLowerCase()} with{' '}
            {named(filling.name, 'filling').toLowerCase()}
          </span>
        </span>
      </Link>
    </li>
  );
}
