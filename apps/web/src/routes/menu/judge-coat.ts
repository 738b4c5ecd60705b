import type { ButtercreamStyle, Covering, Menu } from '#shared/contracts/menu.ts';
import type { AdviceLevel, AllergenId, LabelRegion } from '#shared/contracts/vocabulary.ts';
import { allergenName } from '#shared/kitchen/allergen-names.ts';
import { fareInHeat, sharper } from '#shared/kitchen/heat.ts';
import { formatTemperature } from '#shared/kitchen/measures.ts';

/** What somebody looking at the coats has to mind. */
export type Wish = { readonly allergen: AllergenId | null; readonly warmestC: number | null };

export type Verdict = {
  readonly level: AdviceLevel;
  /** Why it falls away or needs care; empty where nothing speaks against it. */
  readonly reasons: readonly string[];
};

/**
 * Whether a coat is worth a look for a table with that allergy and that warmth. By itself only: a
 * sponge under it has contents of its own.
 */
export function judgeCoat(coat: ButtercreamStyle | Covering, wish: Wish, menu: Menu): Verdict {
  const { labelRegion, temperatureLead } = menu.studio;
  const verdicts: Verdict[] = [];
  if (wish.allergen !== null) verdicts.push(judgeContents(coat, wish.allergen, labelRegion));
  if (wish.warmestC !== null) {
    const level = fareInHeat(coat.holdsToC, wish.warmestC);
    const limit = formatTemperature(coat.holdsToC, temperatureLead);
    const reason = { ok: '', care: `Softens near ${limit}`, stop: `Holds only to ${limit}` }[level];
    verdicts.push({ level, reasons: reason === '' ? [] : [reason] });
  }
  return {
    level: verdicts.reduce<AdviceLevel>((worst, it) => sharper(worst, it.level), 'ok'),
    reasons: verdicts.flatMap((it) => it.reasons),
  };
}

function judgeContents(
  { contents }: ButtercreamStyle | Covering,
  allergen: AllergenId,
  region: LabelRegion,
): Verdict {
  const name = allergenName(allergen, region);
  const states = contents.allergens.filter((it) => it.allergen === allergen).map((it) => it.state);
  if (states.includes('contains')) return { level: 'stop', reasons: [`Contains ${name}`] };
  if (states.includes('unknown'))
    return { level: 'stop', reasons: [`Its labels do not settle ${name}`] };
  if (states.includes('may-contain')) return { level: 'care', reasons: [`May contain ${name}`] };
  return { level: 'ok', reasons: [] };
}
