import { Link } from 'react-router-dom';
import type { ReactNode } from 'react';
import { formatList } from '#shared/dates/format.ts';
import { allergenLabel, spelledFor } from '#shared/kitchen/allergen-names.ts';
import { formatBenchTemperature } from '#shared/kitchen/measures.ts';
import { capitalise } from '#shared/kitchen/sentences.ts';
import { Notice } from '#web/components/ui/notice.tsx';
import { PageTitle } from '#web/components/ui/page-title.tsx';
import { Prose } from '#web/components/ui/prose.tsx';
import { Rim } from '#web/components/ui/rim.tsx';
import { Section } from '#web/components/ui/section.tsx';
import { paths } from '#web/config/paths.ts';
import { useMenu } from '#web/features/menu/api/get-menu.ts';

/** Cold holding and the danger zone: FDA Food Code 3-501.16; USDA FSIS, Danger Zone. */
const coldC = 5;
const warmC = 4;
const hotDayC = 32;

/** How to keep a cake, and what the kitchen handles. Says what is in it, never what it is without. */
export function CarePage() {
  const { studio, styles, decorations, policies } = useMenu();
  const degrees = (celsius: number) => formatBenchTemperature(celsius, studio.temperatureLead);
  const contained = studio.handles.filter((it) => it.state === 'contains');
  const warned = studio.handles.filter(
    (it) => it.state !== 'contains' && it.state !== 'not-declared',
  );
  const label = (it: (typeof studio.handles)[number]) => allergenLabel(it, studio.labelRegion);
  const allergyPolicy = policies.find((it) => it.kind === 'allergy');
  const comesOff = decorations.filter((it) => it.edge !== 'edible' && it.caution !== '');
  const lightlyCooked = styles.filter((it) => it.contents.undercookedEgg);
  return (
    <div className="page grid gap-10 py-8">
      <header className="grid gap-3">
        <PageTitle title="Care and allergens" />
        <p className="measure text-lg">
          How to carry, keep and cut a cake of ours, and what our kitchen handles. Your own cake
          says all of this about itself, on its page and on the card that goes home with it.
        </p>
      </header>

      <Rim label="Keeping it" className="grid gap-8 p-5 sm:p-8 md:grid-cols-3">
        <Rule title="On the road">
          Flat on the floor of the car, cool, out of the sun. Not on a lap, not on a seat.
        </Rule>
        <Rule title="Until you cut it">
          In the fridge, at {degrees(coldC)} or colder. Take it out shortly before: a large tier
          softens in one to three hours and tastes best then.
        </Rule>
        <Rule title="Out of the fridge">
          Two hours at most in all between {degrees(warmC)} and {degrees(60)}, the drive and the
          display included; one hour when it is warmer than {degrees(hotDayC)}.
        </Rule>
      </Rim>

      <div className="grid gap-x-14 gap-y-10 md:grid-cols-2">
        <Section title="A warm day">
          <p className="measure">
            Every buttercream has a warmth above which it slumps, and direct sun is too much for all
            of them. Tell us how warm it gets where the cake stands; we show you which ones stand
            up, and what to do when none does.
          </p>
          <ul className="grid">
            {[...styles]
              .sort((a, b) => b.holdsToC - a.holdsToC)
              .map((it) => (
                <li key={it.id} className="flex justify-between gap-6 border-b border-seam py-2">
                  <span>{it.name}</span>
                  <span className="whitespace-nowrap tabular-nums">
                    holds to {degrees(it.holdsToC)}
                  </span>
                </li>
              ))}
          </ul>
        </Section>

        <Section title="What our kitchen handles">
          {contained.length > 0 && (
            <p className="measure">
              <strong>{capitalise(formatList(contained.map(label)))}.</strong> They are in things we
              make and store here.
            </p>
          )}
          {warned.length > 0 && (
            <p className="measure">
              Makers of what we buy also warn of {formatList(warned.map(label))}.
            </p>
          )}
          <p className="measure">{studio.kitchenNotice}</p>
          {studio.homeKitchenText !== '' && <p className="measure">{studio.homeKitchenText}</p>}
          <Notice tone="butter" title="Tell us before you design">
            <p>
              The order asks about allergies first. We tell you what every choice contains; whether
              somebody may eat it is for them and their doctor to say. For a severe allergy or{' '}
              {spelledFor(studio.labelRegion, 'coeliac disease')} a baker talks with you before
              anything is confirmed.
            </p>
          </Notice>
        </Section>

        <Section title="Before you eat">
          <ul className="measure grid list-disc gap-2 pl-5">
            <li>
              A cake of two or more tiers stands on boards and dowels. They come out as you cut; the
              card says how many there are.
            </li>
            <li>Wires, picks, ribbons and flowers that are not for eating come off first.</li>
            {comesOff.map((it) => (
              <li key={it.id}>
                <strong>{it.name}.</strong> {it.caution}
              </li>
            ))}
            <li>Small decorations can choke a young child: take them off first.</li>
          </ul>
        </Section>

        <Section title="The very young and the vulnerable">
          <ul className="measure grid list-disc gap-2 pl-5">
            <li>
              Nothing with honey for a child under twelve months. Say so in the order and we point
              it out.
            </li>
            {lightlyCooked.length > 0 && (
              <li>
                {capitalise(formatList(lightlyCooked.map((it) => it.name)))} may hold egg that is
                only lightly cooked. Tell us if somebody pregnant, very old, very young or ill will
                eat.
              </li>
            )}
            <li>Where a flavour has alcohol in it, the menu says so.</li>
          </ul>
        </Section>

        <Section title="Flowers">
          <p className="measure">
            Fresh flowers are for looking at. Only kinds that do no harm come near a cake, their
            stems wrapped, from a grower who does not spray them; tell us what you or your florist
            bring. “Non-toxic” on a glitter does not make it food.
          </p>
        </Section>

        {allergyPolicy && (
          <Section title={allergyPolicy.title}>
            <Prose text={allergyPolicy.text} />
          </Section>
        )}
      </div>

      <p className="measure text-slate">
        Times and temperatures follow the USDA’s advice for the home and the FDA’s Food Code; your
        local rules may ask for more.{' '}
        <Link to={paths.policies} className="link">
          All our policies
        </Link>
      </p>
    </div>
  );
}

function Rule({ title, children }: { readonly title: string; readonly children: ReactNode }) {
  return (
    <div className="grid content-start gap-2">
      <h2>{title}</h2>
      <p>{children}</p>
    </div>
  );
}
