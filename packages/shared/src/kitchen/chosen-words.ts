import type { Coating, Design, Look } from '#shared/contracts/design.ts';
import type { Menu } from '#shared/contracts/menu.ts';
import { formatList } from '#shared/dates/format.ts';
import { colourPicks } from './colour.ts';
import { cutWords, insideWords, sheetInside } from './inside-words.ts';
import { capitalise } from './sentences.ts';
import { tierName } from './tier-name.ts';

/** "American buttercream, textured, tinted shell pink (#f5d3cf)"; empty without a coat. */
export function coatWords(coat: Coating | null, menu: Menu): string {
  if (coat === null) return '';
  const style = menu.styles.find((it) => it.id === coat.style)?.name ?? null;
  const covering = menu.coverings.find((it) => it.id === coat.covering)?.name ?? coat.covering;
  const what =
    style === null
      ? covering
      : coat.covering === 'buttercream'
        ? `${style} buttercream`
        : `${covering} over ${style} buttercream`;
  const tint = coat.colour === null ? '' : `, tinted ${colourWords(coat.colour)}`;
  return `${capitalise(what)}, ${coat.finish}${tint}`;
}

/** "Sugar flower, 3, in marigold (#eeb03a), from a florist". */
export function decorationWords(placed: Look['decorations'][number], menu: Menu): string {
  const name =
    menu.decorations.find((it) => it.id === placed.decorationId)?.name ?? placed.decorationId;
  return [
    name,
    placed.quantity > 1 ? String(placed.quantity) : '',
    placed.colour === null ? '' : `in ${colourWords(placed.colour)}`,
    placed.source === 'studio'
      ? ''
      : placed.source === 'customer'
        ? 'brought by the customer'
        : 'from a florist',
  ]
    .filter((it) => it !== '')
    .join(', ');
}

/** A colour by the name it was offered under, with its figure; its figure alone otherwise. */
function colourWords(colour: string): string {
  const pick = colourPicks.find((it) => it.colour === colour.toLowerCase());
  return pick === undefined ? colour : `${pick.name.toLowerCase()} (${colour})`;
}

export type ChosenRow = { readonly label: string; readonly value: string };

/**
 * What was chosen, for reading over: what is inside, what goes over it, the words and what is put
 * on. Tiers that are alike share a row; nothing about the guests is in it.
 */
export function chosenRows({ cake, look, extras }: Design, menu: Menu): ChosenRow[] {
  if (cake === null) return [];
  const tiers = cake.kind === 'tiered' ? cake.tiers : [];
  const on = (tier: number | null) =>
    tier === null || tiers.length < 2 ? '' : ` (${tierName(tier, tiers.length).toLowerCase()})`;
  const parts =
    cake.kind === 'sheet'
      ? [{ name: '', inside: sheetInside(cake.sheet, menu), coat: coatWords(cake.coating, menu) }]
      : tiers
          .map((tier, at) => ({
            name: tierName(at, tiers.length),
            inside: tier.real ? insideWords(tier, menu) : 'For show only',
            coat: coatWords(tier.coating ?? cake.coating, menu),
          }))
          .toReversed();
  const words = look?.words.filter((it) => it.text.trim() !== '') ?? [];
  const placed = look?.decorations ?? [];
  const rows: ChosenRow[] = [
    { label: 'Inside', value: together(parts.map(({ name, inside }) => [name, inside])) },
    { label: 'Over it', value: together(parts.map(({ name, coat }) => [name, coat])) },
    {
      label: 'In the kitchen',
      value: cake.cuttingCakes.map((it) => cutWords(it, menu)).join('; '),
    },
    {
      label: 'Words on it',
      value: words.map((it) => `“${it.text.trim()}”${on(it.tier)}`).join('; '),
    },
    {
      label: 'Put on',
      value: placed.map((it) => `${decorationWords(it, menu)}${on(it.tier)}`).join('; '),
    },
    {
      label: 'Beside it',
      value: formatList(
        extras.map(({ extraId, quantity }) => {
          const name = menu.extras.find((it) => it.id === extraId)?.name ?? extraId;
          return quantity > 1 ? `${quantity} × ${name}` : name;
        }),
      ),
    },
  ];
  return rows.filter((it) => it.value !== '');
}

/** One value where all are alike; else each with its tier's name. */
function together(each: readonly (readonly [name: string, value: string])[]): string {
  const told = each.filter(([, value]) => value !== '');
  const [first] = told;
  if (first === undefined) return '';
  if (told.length === each.length && told.every(([, value]) => value === first[1])) return first[1];
  return told.map(([name, value]) => `${name}: ${value}`).join('. ');
}
