import type { Cake, Coating, Look, Tier } from '#shared/contracts/design.ts';
import type { Menu } from '#shared/contracts/menu.ts';
import { formatList } from '#shared/dates/format.ts';
import { cutWords } from '#shared/kitchen/inside-words.ts';
import { formatLength } from '#shared/kitchen/measures.ts';
import { countOf } from '#shared/kitchen/sentences.ts';

/** What a drawing of a cake shows, in words, from the board up; parts not chosen yet are left out. */
export function describeCake(cake: Cake, look: Look | null, menu: Menu): string {
  const sentences =
    cake.kind === 'sheet'
      ? [describeSheet(cake, menu)]
      : cake.tiers.map((tier, at) => describeTier(tier, at, cake, menu));
  for (const { tier, text } of look?.words ?? []) {
    if (text.trim() !== '') sentences.push(`Words${whereOf(tier, cake)}: “${text.trim()}”.`);
  }
  for (const placed of look?.decorations ?? []) {
    const name = menu.decorations.find((it) => it.id === placed.decorationId)?.name;
    if (name !== undefined) {
      sentences.push(
        `${name}, ${placed.quantity}${placed.tier === null ? '' : whereOf(placed.tier, cake)}.`,
      );
    }
  }
  for (const it of cake.cuttingCakes) sentences.push(`In the kitchen: ${cutWords(it, menu)}.`);
  return sentences.join(' ');
}

function describeTier(tier: Tier, at: number, cake: Cake, menu: Menu): string {
  const lead = menu.studio.lengthLead;
  const across =
    tier.shape === 'rectangle'
      ? `${formatLength(tier.widthMm, lead)} by ${formatLength(tier.depthMm, lead)}`
      : `${formatLength(tier.widthMm, lead)} across`;
  const inside = tier.real
    ? [
        nameOf(menu.sponges, tier.spongeId, ' sponge'),
        nameOf(menu.fillings, tier.fillingId, ' filling'),
        countOf(tier.layers, 'layer').toLowerCase(),
      ].filter((it) => it !== '')
    : ['a dummy without cake'];
  const coat = tier.coating ?? cake.coating;
  const kept = tier.keepsake ? ', kept back as a keepsake' : '';
  const ofHowMany = cake.tiers.length > 1 ? `Tier ${at + 1} from the board: ` : '';
  const text = `${ofHowMany}${tier.shape}, ${across}, ${formatLength(tier.heightMm, lead)} high, ${formatList(inside)}${kept}${describeCoat(coat, menu)}.`;
  return text.charAt(0).toUpperCase() + text.slice(1);
}

function describeSheet(cake: Cake, menu: Menu): string {
  const size = menu.sheetSizes.find((it) => it.id === cake.sheet?.sizeId);
  if (size === undefined) return 'A sheet cake.';
  const lead = menu.studio.lengthLead;
  const inside = [
    nameOf(menu.sponges, cake.sheet?.spongeId ?? null, ' sponge'),
    nameOf(menu.fillings, cake.sheet?.fillingId ?? null, ' filling'),
    countOf(cake.sheet?.layers ?? 1, 'layer').toLowerCase(),
  ].filter((it) => it !== '');
  return `A sheet cake, ${formatLength(size.widthMm, lead)} by ${formatLength(size.depthMm, lead)}, ${formatLength(size.heightMm, lead)} high, ${formatList(inside)}${describeCoat(cake.coating, menu)}.`;
}

function describeCoat(coat: Coating | null, menu: Menu): string {
  if (coat === null) return '';
  const style = nameOf(menu.styles, coat.style, ' buttercream');
  const covering = nameOf(menu.coverings, coat.covering, '').toLowerCase();
  const what =
    coat.covering === 'buttercream' || style === ''
      ? style || covering
      : `${covering} over ${style}`;
  const tint = coat.colour === null ? '' : `, tinted ${coat.colour}`;
  return `, ${coat.finish} ${what}${tint}`;
}

function whereOf(tier: number, cake: Cake): string {
  if (cake.kind === 'sheet' || cake.tiers.length < 2) return '';
  return ` on tier ${tier + 1} from the board`;
}

function nameOf(
  list: readonly { readonly id: string; readonly name: string }[],
  id: string | null,
  kind: string,
): string {
  const name = list.find((it) => it.id === id)?.name;
  if (name === undefined) return '';
  return kind !== '' && name.toLowerCase().includes(kind.trim()) ? name : `${name}${kind}`;
}
