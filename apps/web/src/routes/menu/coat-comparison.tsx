import { useState } from 'react';
import type { ButtercreamStyle, Covering, Menu } from '#shared/contracts/menu.ts';
import { type AllergenId, allergenId } from '#shared/contracts/vocabulary.ts';
import { allergenName, declarableAllergens } from '#shared/kitchen/allergen-names.ts';
import { byLevel } from '#shared/kitchen/heat.ts';
import { formatTemperature, parseTemperature } from '#shared/kitchen/measures.ts';
import { capitalise } from '#shared/kitchen/sentences.ts';
import { CoatSwatch } from '#web/components/coats/coat-swatch.tsx';
import { Dots } from '#web/components/ui/dots.tsx';
import { NumberField } from '#web/components/ui/number-field.tsx';
import { ToneGlyph } from '#web/components/ui/notice.tsx';
import { Select } from '#web/components/ui/select.tsx';
import { containsLine } from '#web/features/order-wizard/design/contains.ts';
import { classNames } from '#web/lib/class-names.ts';
import { type Verdict, type Wish, judgeCoat } from './judge-coat.ts';

const details = { none: 'soft edges only', soft: 'soft shapes', fine: 'fine shapes' } as const;

/** The buttercreams side by side, and which fall away for an allergy or a warm day, and why. */
export function CoatComparison({ menu }: { readonly menu: Menu }) {
  const [allergen, setAllergen] = useState<AllergenId | null>(null);
  const [warmestC, setWarmestC] = useState<number | null>(null);
  const unreadable = warmestC !== null && Number.isNaN(warmestC);
  const wish: Wish = { allergen, warmestC: unreadable ? null : warmestC };
  const { labelRegion, temperatureLead } = menu.studio;
  const judged = menu.styles
    .map((style) => ({ style, verdict: judgeCoat(style, wish, menu) }))
    .sort((a, b) => byLevel(a.verdict.level, b.verdict.level));
  const left = judged.filter((it) => it.verdict.level !== 'stop').length;
  const asked = wish.allergen !== null || wish.warmestC !== null;
  return (
    <div className="grid gap-6">
      <div className="grid gap-5 rounded-action bg-cloud p-4 sm:grid-cols-2 sm:items-end sm:p-5">
        <Select
          label="Somebody must not have"
          value={allergen ?? ''}
          onChange={(event) => {
            const chosen = allergenId.safeParse(event.target.value);
            setAllergen(chosen.success ? chosen.data : null);
          }}
        >
          <option value="">nothing in particular</option>
          {declarableAllergens(labelRegion).map((it) => (
            <option key={it} value={it}>
              {allergenName(it, labelRegion)}
            </option>
          ))}
        </Select>
        <NumberField
          label="The warmest it will get"
          hint={temperatureLead === 'F' ? '“77”, or “25 C”' : '“25”, or “77 F”'}
          inputMode="text"
          value={warmestC}
          onValue={setWarmestC}
          read={(text) => parseTemperature(text, temperatureLead)}
          write={(value) => formatTemperature(value, temperatureLead)}
          error={
            unreadable ? `Write degrees, like ${temperatureLead === 'F' ? '77' : '25'}.` : undefined
          }
          className="max-w-52 tabular-nums"
        />
      </div>
      <p role="status" className="text-slate">
        {asked
          ? `Left by themselves: ${left} of ${menu.styles.length} buttercreams. The sponge under them counts too.`
          : 'Each swatch is the colour the food has by itself.'}
      </p>
      <ul className="grid">
        {judged.map(({ style, verdict }) => (
          <StyleRow key={style.id} style={style} verdict={verdict} menu={menu} />
        ))}
      </ul>
      <h3>What else goes over a cake</h3>
      <ul className="grid gap-x-12 md:grid-cols-3">
        {menu.coverings
          .filter((it) => it.id !== 'buttercream')
          .map((covering) => (
            <CoveringRow
              key={covering.id}
              covering={covering}
              verdict={judgeCoat(covering, wish, menu)}
              menu={menu}
            />
          ))}
      </ul>
    </div>
  );
}

type StyleProps = {
  readonly style: ButtercreamStyle;
  readonly verdict: Verdict;
  readonly menu: Menu;
};

function StyleRow({ style, verdict, menu }: StyleProps) {
  const { labelRegion, temperatureLead } = menu.studio;
  const facts = [
    ['Sweetness', <Dots key="sweet" label="Sweetness" value={style.sweetness} bare />],
    ['Smoothness', <Dots key="smooth" label="Smoothness" value={style.smoothness} bare />],
    ['Piping', details[style.detail] + (style.crusts ? ', sets a crust' : '')],
    ['Holds to', formatTemperature(style.holdsToC, temperatureLead)],
    ['Best for', style.bestFor],
  ] as const;
  return (
    <li
      className={classNames(
        'grid gap-x-6 gap-y-3 border-b border-seam py-5 md:grid-cols-[6rem_minmax(0,5fr)_minmax(0,7fr)]',
        verdict.level === 'stop' && 'bg-cloud',
      )}
    >
      <CoatSwatch menu={menu} covering="buttercream" style={style.id} className="w-24 bg-enamel" />
      <div className="grid content-start gap-1">
        <h3>{style.name}</h3>
        <p>{style.blurb}</p>
        <p className="text-sm text-slate">
          {style.how} {capitalise(containsLine(style.contents, labelRegion))}.
        </p>
        <VerdictLine verdict={verdict} />
      </div>
      <dl className="grid content-start gap-x-4 gap-y-1 text-sm sm:grid-cols-[6rem_1fr]">
        {facts.map(([name, value]) => (
          <div key={name} className="grid grid-cols-[6rem_1fr] gap-x-4 sm:contents">
            <dt className="text-slate">{name}</dt>
            <dd>{value}</dd>
          </div>
        ))}
      </dl>
    </li>
  );
}

function CoveringRow({
  covering,
  verdict,
  menu,
}: {
  readonly covering: Covering;
  readonly verdict: Verdict;
  readonly menu: Menu;
}) {
  const { labelRegion, temperatureLead } = menu.studio;
  const over = covering.id === 'ganache' ? null : (menu.styles[1]?.id ?? null);
  return (
    <li className="grid content-start gap-1 border-b border-seam py-5">
      <CoatSwatch menu={menu} covering={covering.id} style={over} className="w-24" />
      <h4 className="text-lg">{covering.name}</h4>
      <p>{covering.blurb}</p>
      <p className="text-sm text-slate">
        {covering.id === 'ganache' ? '' : 'Lies over a buttercream, which adds its own contents. '}
        {capitalise(containsLine(covering.contents, labelRegion))}. Holds to{' '}
        {formatTemperature(covering.holdsToC, temperatureLead)}.
      </p>
      <VerdictLine verdict={verdict} />
    </li>
  );
}

function VerdictLine({ verdict: { level, reasons } }: { readonly verdict: Verdict }) {
  if (reasons.length === 0) return null;
  const stop = level === 'stop';
  return (
    <p className="flex gap-2 text-sm font-semibold">
      <ToneGlyph tone={stop ? 'berry' : 'butter'} />
      <span className={stop ? 'text-berry' : undefined}>
        {stop ? 'Falls away. ' : 'With care. '}
        {reasons.join('. ')}.
      </span>
    </p>
  );
}
