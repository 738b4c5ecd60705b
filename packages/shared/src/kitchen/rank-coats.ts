import type { Contents, Menu } from '#shared/contracts/menu.ts';
import type { AdviceLevel } from '#shared/contracts/vocabulary.ts';
import { allergenName } from './allergen-names.ts';
import { clashesWith, dietClashes, isListed } from './clashes.ts';
import { byLevel, coatLimitC, fareOfCoat, sharper } from './heat.ts';
import { formatTemperature } from './measures.ts';
import type { Coat, RankedCoat, Table } from './situation.ts';

/** A coat of the menu with how much warmth it bears. */
type MenuCoat = Coat & { readonly limitC: number; readonly limit: string };

const known = new WeakMap<Menu, readonly MenuCoat[]>();

/**
 * Every coat the menu makes, each covering over each style and those that need none: by how much
 * warmth they bear, then by how smooth they come out. Worked out once for a menu.
 */
function coatsOf(menu: Menu): readonly MenuCoat[] {
  const before = known.get(menu);
  if (before !== undefined) return before;
  const lead = menu.studio.temperatureLead;
  const coats = menu.coverings
    .flatMap((covering): Coat[] =>
      covering.id === 'ganache'
        ? [{ covering, style: null }]
        : menu.styles.map((style) => ({ covering, style })),
    )
    .map((coat) => {
      const limitC = coatLimitC(coat);
      return { ...coat, limitC, limit: formatTemperature(limitC, lead) };
    })
    .sort((a, b) => b.limitC - a.limitC || (b.style?.smoothness ?? 0) - (a.style?.smoothness ?? 0));
  known.set(menu, coats);
  return coats;
}

/**
 * All coats, best first for the setting and the guests: by level, then those without what a guest
 * cannot eat (a cooler place changes the warmth, nothing changes what is in it), then by how much
 * warmth they have to spare, then by how smooth they come out.
 */
export function rankCoats(table: Table): RankedCoat[] {
  const ranked = coatsOf(table.resolved.menu).map((coat) => {
    const { covering, style } = coat;
    const heat = judgeHeat(coat, table);
    const guests = judgeGuests(coat, table);
    const level = sharper(heat.level, guests?.level ?? 'ok');
    const sentence = guests === null ? heat.sentence : `${guests.sentence} ${heat.sentence}`;
    const rank = { covering: covering.id, style: style?.id ?? null, level, sentence };
    return { covering, style, rank, heat: heat.level, forGuests: guests?.level ?? 'ok' };
  });
  // Where both are the same the menu's own order stays.
  return ranked
    .sort((a, b) => byLevel(a.rank.level, b.rank.level) || byLevel(a.forGuests, b.forGuests))
    .map(({ covering, style, rank, heat }) => ({ covering, style, rank, heat }));
}

function judgeHeat(
  { limitC, limit }: MenuCoat,
  { resolved, warmth }: Table,
): { level: AdviceLevel; sentence: string } {
  const { setting } = resolved.design;
  if (setting === null || warmth === null) return { level: 'ok', sentence: `Holds to ${limit}.` };
  const level = fareOfCoat(limitC, setting, warmth, resolved.menu.kitchen);
  if (setting.place === 'sun') {
    return { level, sentence: `No coat lasts in direct sun; this one holds to ${limit} in shade.` };
  }
  if (level === 'stop') return { level, sentence: `Too warm for it: it holds to ${limit}.` };
  if (level === 'ok') return { level, sentence: `Stands up well: it holds to ${limit}.` };
  return {
    level,
    sentence: warmth.known
      ? `Close to its limit: it holds to ${limit}.`
      : `Holds to ${limit}; it would help to know how warm it will be.`,
  };
}

function judgeGuests(
  { covering, style }: Coat,
  { resolved }: Table,
): { level: AdviceLevel; sentence: string } | null {
  const { allergies, diets } = resolved.design.guests;
  if (allergies.length === 0 && diets.length === 0) return null;
  const inside: Contents[] =
    style === null ? [covering.contents] : [covering.contents, style.contents];
  const region = resolved.menu.studio.labelRegion;
  for (const declared of allergies) {
    if (isListed(declared) && inside.some((it) => clashesWith(it, declared))) {
      const name = allergenName(declared.allergen, region);
      return { level: 'stop', sentence: `It has ${name}, which you told us of.` };
    }
  }
  for (const diet of diets) {
    const [first] = inside.flatMap((it) => dietClashes(it, diet));
    if (first !== undefined) return { level: 'care', sentence: `It has ${first}.` };
  }
  return null;
}
