import type { Contents } from '#shared/contracts/menu.ts';
import type { AdviceLevel } from '#shared/contracts/vocabulary.ts';
import { allergenName } from './allergen-names.ts';
import { clashesWith, dietClashes, isListed } from './clashes.ts';
import { byLevel, coatLimitC, fareOfCoat, sharper } from './heat.ts';
import { formatTemperature } from './measures.ts';
import type { Coat, RankedCoat, Table } from './situation.ts';

/** Every coat the menu makes: each covering over each style, and those that need none. */
function coatsOfMenu({ coverings, styles }: Table['resolved']['menu']): Coat[] {
  return coverings.flatMap((covering): Coat[] =>
    covering.id === 'ganache'
      ? [{ covering, style: null }]
      : styles.map((style) => ({ covering, style })),
  );
}

/**
 * All coats, best first for the setting and the guests: by level, then by how much warmth they
 * have to spare, then by how smooth they come out.
 */
export function rankCoats(table: Table): RankedCoat[] {
  return coatsOfMenu(table.resolved.menu)
    .map((coat) => ({ ...coat, limitC: coatLimitC(coat), ...judge(coat, table) }))
    .sort(
      (a, b) =>
        byLevel(a.level, b.level) ||
        b.limitC - a.limitC ||
        (b.style?.smoothness ?? 0) - (a.style?.smoothness ?? 0),
    )
    .map(({ covering, style, level, sentence }) => ({
      covering,
      style,
      rank: { covering: covering.id, style: style?.id ?? null, level, sentence },
    }));
}

function judge(coat: Coat, table: Table): { level: AdviceLevel; sentence: string } {
  const heat = judgeHeat(coatLimitC(coat), table);
  const guests = judgeGuests(coat, table);
  return guests === null
    ? heat
    : { level: sharper(heat.level, guests.level), sentence: `${guests.sentence} ${heat.sentence}` };
}

function judgeHeat(
  limitC: number,
  { resolved, warmth }: Table,
): { level: AdviceLevel; sentence: string } {
  const { setting } = resolved.design;
  const limit = formatTemperature(limitC, resolved.menu.studio.temperatureLead);
  if (setting === null || warmth === null) return { level: 'ok', sentence: `Holds to ${limit}.` };
  const level = fareOfCoat(limitC, setting, warmth);
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
