import type { Cake, Coating, Look, Tier } from '#shared/contracts/design.ts';
import type { Menu } from '#shared/contracts/menu.ts';
import { formatLength } from '#shared/kitchen/measures.ts';
import { capitalise, countOf } from '#shared/kitchen/sentences.ts';
import { summariseCake } from '#shared/kitchen/summarise-design.ts';

type Props = {
  readonly cake: Cake;
  readonly look: Look | null;
  readonly menu: Menu;
  /** Portions per tier from the board up, as estimated. */
  readonly perTier: readonly number[];
};

/** The cake as chosen, tier by tier from the top down, as it stands in the drawing. */
export function CakeChoices({ cake, look, menu, perTier }: Props) {
  if (cake.kind === 'sheet') {
    return (
      <Part
        name={summariseCake(cake, menu)}
        size={portionWords(perTier[0] ?? 0)}
        lines={[
          insideWords(cake.sheet?.spongeId ?? null, cake.sheet?.fillingId ?? null, menu),
          countOf(cake.sheet?.layers ?? 1, 'layer'),
          coatWords(cake.coating, menu),
          ...lookWords(0, look, menu),
        ]}
      />
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
                  ? `${insideWords(tier.spongeId, tier.fillingId, menu)}, ${countOf(tier.layers, 'layer').toLowerCase()}`
                  : '',
                coatWords(tier.coating ?? cake.coating, menu),
                ...lookWords(at, look, menu),
              ]}
            />
          </li>
        ))}
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

function insideWords(spongeId: string | null, fillingId: string | null, menu: Menu): string {
  const sponge = menu.sponges.find((it) => it.id === spongeId)?.name ?? spongeId ?? '';
  const filling = menu.fillings.find((it) => it.id === fillingId)?.name ?? fillingId;
  return filling === null ? sponge : `${sponge}, filled with ${filling.toLowerCase()}`;
}

function coatWords(coat: Coating | null, menu: Menu): string {
  if (coat === null) return '';
  const style = menu.styles.find((it) => it.id === coat.style)?.name ?? null;
  const covering = menu.coverings.find((it) => it.id === coat.covering)?.name ?? coat.covering;
  const what =
    style === null
      ? covering
      : coat.covering === 'buttercream'
        ? `${style} buttercream`
        : `${covering} over ${style} buttercream`;
  const tint = coat.colour === null ? '' : `, tinted ${coat.colour}`;
  return `${capitalise(what)}, ${coat.finish}${tint}`;
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

/** "Sugar flowers, 3, in #c04a62, from the florist". */
export function decorationWords(placed: Look['decorations'][number], menu: Menu): string {
  const name =
    menu.decorations.find((it) => it.id === placed.decorationId)?.name ?? placed.decorationId;
  return [
    name,
    placed.quantity > 1 ? String(placed.quantity) : '',
    placed.colour === null ? '' : `in ${placed.colour}`,
    placed.source === 'studio'
      ? ''
      : placed.source === 'customer'
        ? 'brought by the customer'
        : 'from a florist',
  ]
    .filter((it) => it !== '')
    .join(', ');
}
