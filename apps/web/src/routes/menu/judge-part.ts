import type {
  ButtercreamStyle,
  Contents,
  Covering,
  Decoration,
  Filling,
  Menu,
} from '#shared/contracts/menu.ts';
import type { AdviceLevel, AllergenId } from '#shared/contracts/vocabulary.ts';
import { allergenName, speciesName } from '#shared/kitchen/allergen-names.ts';
import { stateFor } from '#shared/kitchen/clashes.ts';
import { fareInHeat, sharper } from '#shared/kitchen/heat.ts';
import { formatTemperature } from '#shared/kitchen/measures.ts';

/** What somebody looking over the menu has to mind. */
export type Wish = {
  readonly allergen: AllergenId | null;
  /** One kind of it, where it is one alone: `almond`. */
  readonly species: string | null;
  readonly warmestC: number | null;
};

export const noWish: Wish = { allergen: null, species: null, warmestC: null };

export type Verdict = {
  readonly level: AdviceLevel;
  /** Why it falls away or needs care; empty where nothing speaks against it. */
  readonly reasons: readonly string[];
};

const fine: Verdict = { level: 'ok', reasons: [] };

/** "egg", "almond": what the wish is about, in the region's words. */
export function wishName({ allergen, species }: Wish, { studio }: Menu): string {
  if (species !== null) return speciesName(species);
  return allergen === null ? '' : allergenName(allergen, studio.labelRegion);
}

/** Whether a part is worth a look for a table with that allergy: by what its labels say. */
export function judgeContents(contents: Contents, wish: Wish, menu: Menu): Verdict {
  const { allergen, species } = wish;
  if (allergen === null) return fine;
  const name = wishName(wish, menu);
  const declared = { allergen, species, text: '', severity: 'allergy', guests: 1 } as const;
  const state = stateFor(contents, declared);
  if (state === 'contains') return { level: 'stop', reasons: [`Contains ${name}`] };
  if (state === 'unknown') return { level: 'stop', reasons: [`Its labels do not settle ${name}`] };
  if (state === 'may-contain') return { level: 'care', reasons: [`May contain ${name}`] };
  return fine;
}

/**
 * Whether a coat is worth a look for a table with that allergy and that warmth. By itself only: a
 * sponge under it has contents of its own.
 */
export function judgeCoat(coat: ButtercreamStyle | Covering, wish: Wish, menu: Menu): Verdict {
  return both(
    judgeContents(coat.contents, wish, menu),
    judgeHeat(coat.holdsToC, wish, menu, { over: 'Holds only to', near: 'Softens near' }),
  );
}

/** A filling above its limit runs, which inside a cake is care and no stop. */
export function judgeFilling(filling: Filling, wish: Wish, menu: Menu): Verdict {
  const words = { over: 'Soft above', near: 'Softens near' };
  const heat = judgeHeat(filling.holdsToC, wish, menu, words);
  return both(judgeContents(filling.contents, wish, menu), {
    ...heat,
    level: heat.level === 'stop' ? 'care' : heat.level,
  });
}

/** A decoration that comes off before eating touches the cake all the same. */
export function judgeDecoration({ contents }: Decoration, wish: Wish, menu: Menu): Verdict {
  return judgeContents(contents, wish, menu);
}

function judgeHeat(
  limitC: number,
  { warmestC }: Wish,
  { studio, kitchen }: Menu,
  words: { readonly over: string; readonly near: string },
): Verdict {
  if (warmestC === null) return fine;
  const level = fareInHeat(limitC, warmestC, kitchen);
  if (level === 'ok') return fine;
  const limit = formatTemperature(limitC, studio.temperatureLead);
  return { level, reasons: [`${level === 'stop' ? words.over : words.near} ${limit}`] };
}

function both(a: Verdict, b: Verdict): Verdict {
  return { level: sharper(a.level, b.level), reasons: [...a.reasons, ...b.reasons] };
}
