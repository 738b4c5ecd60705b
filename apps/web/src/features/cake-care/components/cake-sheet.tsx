import type { CakeCare } from '#shared/contracts/cards.ts';
import type { Design } from '#shared/contracts/design.ts';
import type { Menu } from '#shared/contracts/menu.ts';
import { formatDay, formatList } from '#shared/dates/format.ts';
import { capitalise } from '#shared/kitchen/sentences.ts';
import { CakeDrawing } from '#web/components/cake-drawing/cake-drawing.tsx';
import { CuttingPlan } from '#web/components/cutting-plan/cutting-plan.tsx';
import { LabelWords } from '#web/components/label/label-words.tsx';
import { Fold } from '#web/components/ui/fold.tsx';
import { Notice } from '#web/components/ui/notice.tsx';
import { PageTitle } from '#web/components/ui/page-title.tsx';
import { Rim } from '#web/components/ui/rim.tsx';
import { Section } from '#web/components/ui/section.tsx';

type Props = { readonly care: CakeCare; readonly menu: Menu };

/** One cake for whoever stands before it: how to keep it, what comes out, what is in it, how it is cut. */
export function CakeSheet({ care, menu }: Props) {
  const { label } = care;
  const { locale, kitchenNotice, phone } = menu.studio;
  const first = [...label.remove, ...label.cautions];
  return (
    <>
      <header className="grid gap-2">
        <PageTitle title="This cake" />
        <p className="measure text-lg">{care.product}</p>
        <p className="text-slate">
          Made by {menu.studio.name} for {formatDay(care.pickupOn, { locale, year: true })}.
        </p>
      </header>
      <div className="grid items-start gap-x-12 gap-y-8 lg:grid-cols-[minmax(0,5fr)_minmax(0,6fr)]">
        <div className="grid gap-5">
          <Rim label="The cake" className="p-4 sm:p-6">
            <CakeDrawing cake={care.cake} look={care.look} menu={menu} />
          </Rim>
          <Notice tone="butter" title="Keep it cool">
            <p>{care.keepCool}</p>
          </Notice>
        </div>
        <div className="grid gap-9">
          {first.length > 0 && (
            <Section title="Before anybody eats">
              <ul className="measure grid list-disc gap-2 pl-5">
                {first.map((it) => (
                  <li key={it}>{it}</li>
                ))}
              </ul>
            </Section>
          )}
          <Section title="What is in it">
            <div className="measure grid gap-3">
              <LabelWords label={label} locale={locale} />
              {care.alsoIn.length > 0 && (
                <p>{capitalise(formatList(care.alsoIn.map((it) => it.text)))}: in it as well.</p>
              )}
              <p className="text-sm text-slate">{kitchenNotice}</p>
            </div>
            <Fold label="Part by part">
              <ul className="measure grid gap-3">
                {care.parts.map((it) => (
                  <li key={it.name}>
                    <strong>{it.name}.</strong> {it.statement === '' ? '' : `${it.statement}. `}
                    {it.contains.length > 0 && `Contains ${formatList(it.contains)}.`}
                  </li>
                ))}
              </ul>
            </Fold>
          </Section>
        </div>
      </div>
      {care.cake !== null && (
        <Section title="Cutting it">
          <CuttingPlan design={designOf(care)} menu={menu} />
        </Section>
      )}
      <p className="measure text-slate">
        Something not right with it? Ring us: {phone}. Local food rules and your doctor’s word come
        before anything said here.
      </p>
    </>
  );
}

/** As much of a design as cutting it takes; who will eat it is nobody’s business here. */
function designOf({ cake, look, portionSizeId, portions }: CakeCare): Design {
  return {
    guests: {
      headCount: Math.max(1, portions.fed),
      occasionId: '',
      otherDesserts: false,
      portionSizeId,
      allergies: [],
      diets: [],
      dietNote: '',
      infants: false,
      susceptible: false,
    },
    cake,
    setting: null,
    look,
    extras: [],
  };
}
