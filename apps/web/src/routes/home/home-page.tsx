import { Link } from 'react-router-dom';
import type { Menu } from '#shared/contracts/menu.ts';
import { formatList } from '#shared/dates/format.ts';
import { allergenLabel } from '#shared/kitchen/allergen-names.ts';
import { capitalise } from '#shared/kitchen/sentences.ts';
import { summariseCake } from '#shared/kitchen/summarise-design.ts';
import { CakeDrawing } from '#web/components/cake-drawing/cake-drawing.tsx';
import { LinkButton } from '#web/components/ui/link-button.tsx';
import { PageTitle } from '#web/components/ui/page-title.tsx';
import { Rim } from '#web/components/ui/rim.tsx';
import { Section } from '#web/components/ui/section.tsx';
import { paths } from '#web/config/paths.ts';
import { useMenu } from '#web/features/menu/api/get-menu.ts';
import { OpenDays, PickupHours, useOpenDays } from './open-days.tsx';
import { type SampleCake, sampleCakes } from '#web/components/sample-cakes/sample-cakes.ts';
import { figuresOf } from './price-of-sample.ts';
import { StepRuler } from './step-ruler.tsx';

/** What the studio makes, how ordering goes, and when. */
export function HomePage() {
  const menu = useMenu();
  const { studio } = menu;
  const dates = useOpenDays(menu);
  const [first, ...others] = sampleCakes(menu);
  return (
    <div className="grid gap-16 pb-4">
      <div className="page grid items-center gap-x-14 gap-y-8 pt-8 lg:grid-cols-[minmax(0,6fr)_minmax(0,5fr)] lg:pt-14">
        <div className="grid justify-items-start gap-6">
          <PageTitle
            title="Cakes made to order"
            className="text-[clamp(2.1rem,1.4rem+3.2vw,3.5rem)]"
          >
            A cake for your day, drawn to the inch before you ask for it
          </PageTitle>
          <p className="max-w-xl text-lg">
            {studio.name} makes celebration cakes in {studio.town}. Tell us who is coming and where
            the cake will stand; you see it to scale, with its price and what is in it, before
            anything is sent.
          </p>
          <div className="flex flex-wrap gap-3">
            <LinkButton to={paths.order}>Order a cake</LinkButton>
            <LinkButton to={paths.menu} kind="secondary">
              See what we make
            </LinkButton>
          </div>
        </div>
        {first && (
          <Rim label="A cake of ours" className="grid gap-4 p-5 sm:p-7">
            <div className="flex items-baseline justify-between gap-4">
              <h2>{first.name}</h2>
              <p className="shrink-0 text-sm text-slate">to scale</p>
            </div>
            <CakeDrawing cake={first.design.cake} look={first.design.look} menu={menu} />
            <SampleLine sample={first} menu={menu} />
          </Rim>
        )}
      </div>

      {others.length > 0 && (
        <div className="page grid gap-x-10 gap-y-8 sm:grid-cols-2">
          {others.map((sample) => (
            <article key={sample.id} className="grid content-end gap-3">
              <CakeDrawing
                cake={sample.design.cake}
                look={sample.design.look}
                menu={menu}
                size="small"
                trimmed
                className="max-h-60"
              />
              <h2 className="text-lg">{sample.name}</h2>
              <SampleLine sample={sample} menu={menu} />
            </article>
          ))}
        </div>
      )}

      <div className="page">
        <Section title="How ordering goes">
          <p className="measure text-slate">
            Six short steps, about three minutes. Nothing is booked and nothing is paid until a
            baker has looked at it and you have agreed.
          </p>
          <StepRuler />
        </Section>
      </div>

      <div className="page">
        <Section title="The next open days">
          <p className="measure text-slate">
            Every date you can press is one the bench can keep. These look good for a cake for
            twenty; the order checks again for yours.
          </p>
          <OpenDays dates={dates} locale={studio.locale} />
          <div>
            <LinkButton to={paths.order} kind="secondary">
              Choose a day
            </LinkButton>
          </div>
        </Section>
      </div>

      <div className="page grid gap-x-14 gap-y-10 md:grid-cols-2">
        <Section title="Allergies at your table">
          <p className="measure">
            We ask about them first, so that every choice can say what it contains.{' '}
            {studio.handles.length > 0 &&
              `Our kitchen handles ${formatList(studio.handles.map((it) => allergenLabel(it, studio.labelRegion)))}.`}
          </p>
          <div>
            <Link to={paths.care} className="link inline-block py-2">
              Care and allergens
            </Link>
          </div>
        </Section>
        <Section title="Where to find us">
          <address className="not-italic">
            {studio.street}
            <br />
            {studio.town}
            {studio.region !== '' && `, ${studio.region}`} {studio.postcode}
          </address>
          <h3>Cakes are collected</h3>
          <PickupHours dates={dates} locale={studio.locale} />
        </Section>
      </div>
    </div>
  );
}

function SampleLine({ sample, menu }: { readonly sample: SampleCake; readonly menu: Menu }) {
  const { cake } = sample.design;
  const { portions, price } = figuresOf(sample.design, menu);
  if (cake === null) return null;
  return (
    <p className="flex flex-wrap items-baseline justify-between gap-x-6 border-t border-seam pt-3">
      <span>
        {capitalise(summariseCake(cake, menu))}, feeds {portions}
      </span>
      <span className="font-display text-xl font-semibold tabular-nums">about {price}</span>
    </p>
  );
}
