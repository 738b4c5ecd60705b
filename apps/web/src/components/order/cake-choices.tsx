import type { Cake, Look, Tier } from '#shared/contracts/design.ts';
import type { Menu } from '#shared/contracts/menu.ts';
import { coatWords, decorationWords } from '#shared/kitchen/chosen-words.ts';
import { cutWords, insideWords } from '#shared/kitchen/inside-words.ts';
import { formatLength } from '#shared/kitchen/measures.ts';
import { plainCoatOf } from '#shared/kitchen/resolve-design.ts';
import { capitalise, countOf } from '#shared/kitchen/sentences.ts';
import { summariseCake } from '#shared/kitchen/summarise-design.ts';

type Props = {
  readonly cake: Cake;
  readonly look: Look | null;
  readonly menu: Menu;
  /** Portions per tier from the board up, as estimated. */
  readonly perTier: readonly number[];
  readonly perCuttingCake: readonly number[];
};

/** The cake as chosen, tier by tier from the top down, as it stands in the drawing. */
export function CakeChoices({ cake, look, menu, perTier, perCuttingCake }: Props) {
  const cutting = cake.cuttingCakes.map((it, at) => (
    <li key={`cutting ${at}`} className="py-3">
      <Part
        name="In the kitchen"
        size={portionWords(perCuttingCake[at] ?? 0)}
        lines={[cutWords(it, menu), coatWords(plainCoatOf(cake), menu)]}
      />
    </li>
  ));
  if (cake.kind === 'sheet') {
    const shown = (
      <Part
        name={summariseCake({ ...cake, cuttingCakes: [] }, menu)}
        size={portionWords(perTier[0] ?? 0)}
        lines={[
          cake.sheet === null ? '' : insideWords(cake.sheet, menu),
          countOf(cake.sheet?.layers ?? 1, 'layer'),
          coatWords(cake.coating, menu),
          ...lookWords(0, look, menu),
        ]}
      />
    );
    if (cutting.length === 0) return shown;
    return (
      <ol className="divide-y divide-seam border-y border-seam">
        <li className="py-3">{shown}</li>
        {cutting}
      </ol>
    );
  }
  const lead = menu.studio.lengthLead;
  return (
    <ol className="divide-y divide-seam border-y border-seam">
      {cake.tiers
        .map((tier, at) => ({ tier, at }))
        .toReversed()
        .map(({ tier, at }) => (
          <li key={at} className="py-3">
            <Part
              name={tierName(tier, lead)}
              size={
                tier.real
                  ? tier.keepsake
                    ? 'kept back as a keepsake'
                    : portionWords(perTier[at] ?? 0)
                  : 'a dummy'
              }
              lines={[
                tier.real
                  ? `${insideWords(tier, menu)}, ${countOf(tier.layers, 'layer').toLowerCase()}`
                  : '',
                coatWords(tier.coating ?? cake.coating, menu),
                ...lookWords(at, look, menu),
              ]}
            />
          </li>
        ))}
      {cutting}
    </ol>
  );
}

type PartProps = {
  readonly name: string;
  readonly size: string;
  readonly lines: readonly string[];
};

function Part({ name, size, lines }: PartProps) {
  return (
    <div className="grid gap-x-6 gap-y-0.5 sm:grid-cols-[11rem_1fr]">
      <div>
        <p className="font-display font-semibold">{name}</p>
        <p className="text-sm text-slate tabular-nums">{size}</p>
      </div>
      <div>
        {lines
          .filter((it) => it !== '')
          .map((it) => (
            <p key={it}>{it}</p>
          ))}
      </div>
    </div>
  );
}

function tierName(tier: Tier, lead: 'in' | 'cm'): string {
  const across =
    tier.shape === 'rectangle'
      ? `${formatLength(tier.widthMm, lead)} by ${formatLength(tier.depthMm, lead)}`
      : formatLength(tier.widthMm, lead);
  return `${capitalise(tier.shape)}, ${across}`;
}

function portionWords(portions: number): string {
  return portions === 1 ? '1 portion' : `${portions} portions`;
}

/** Words and decorations on one tier. */
function lookWords(tier: number, look: Look | null, menu: Menu): string[] {
  if (look === null) return [];
  const words = look.words
    .filter((it) => it.tier === tier && it.text.trim() !== '')
    .map((it) => `Words: “${it.text.trim()}”`);
  const placed = look.decorations
    .filter((it) => it.tier === tier)
    .map((it) => decorationWords(it, menu));
  return [...words, ...placed];
}
