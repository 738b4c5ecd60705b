import type { ButtercreamStyle, Covering, Filling, Menu, Sponge } from '#shared/contracts/menu.ts';
import { byLevel, coatLimitC } from '#shared/kitchen/heat.ts';
import { judgeCoat, judgeContents, judgeFilling, type Verdict, type Wish } from './judge-part.ts';

type Coat = { readonly covering: Covering; readonly style: ButtercreamStyle | null };

/** A sponge, a filling and a coat that go together for a table. */
export type WholeCake = {
  readonly sponge: Sponge;
  readonly filling: Filling;
  readonly coat: Coat;
};

const most = 6;

/**
 * Whole cakes that nothing speaks against outright, a coat each, best first: sponge, filling,
 * covering and the buttercream under it all judged. Empty where one of them cannot be had.
 */
export function wholeCakesFor(wish: Wish, menu: Menu): WholeCake[] {
  const left = <Part>(parts: readonly Part[], judge: (part: Part) => Verdict) =>
    parts
      .map((part) => ({ part, level: judge(part).level }))
      .filter(({ level }) => level !== 'stop')
      .sort((a, b) => byLevel(a.level, b.level));
  /** Of those that nothing speaks against, if there are any: a warning is for want of better. */
  const best = <Part>(parts: readonly Part[], judge: (part: Part) => Verdict): Part[] =>
    left(parts, judge)
      .filter(({ level }, _, all) => level === all[0]?.level)
      .map(({ part }) => part);
  const sponges = best(menu.sponges, (it) => judgeContents(it.contents, wish, menu));
  const fillings = steadiest(
    best(menu.fillings, (it) => judgeFilling(it, wish, menu)),
    wish,
  );
  const coats = left(coatsOf(menu), (it) => judgeWholeCoat(it, wish, menu)).map(({ part }) => part);
  return coats.slice(0, most).flatMap((coat, at) => {
    const sponge = sponges[at % sponges.length];
    const filling = fillings[at % fillings.length];
    return sponge === undefined || filling === undefined ? [] : [{ sponge, filling, coat }];
  });
}

/** Fillings that stay firm at that warmth, if there are any: a soft one is care in a sheet, and a stop under a tier. */
function steadiest(fillings: Filling[], { warmestC }: Wish): Filling[] {
  if (warmestC === null) return fillings;
  const firm = fillings.filter((it) => it.holdsToC >= warmestC);
  return firm.length > 0 ? firm : fillings;
}

/** Each buttercream, fondant over each, and ganache. */
function coatsOf({ coverings, styles }: Menu): Coat[] {
  const of = (id: Covering['id']) => coverings.filter((it) => it.id === id);
  return [
    ...of('buttercream').flatMap((covering) => styles.map((style) => ({ covering, style }))),
    ...of('ganache').map((covering) => ({ covering, style: null })),
    ...of('fondant').flatMap((covering) => styles.map((style) => ({ covering, style }))),
  ];
}

/** What is outermost meets the heat; what lies under it is eaten all the same. */
function judgeWholeCoat(coat: Coat, wish: Wish, menu: Menu): Verdict {
  const { covering, style } = coat;
  const outer = judgeCoat({ ...covering, holdsToC: coatLimitC(coat) }, wish, menu);
  if (style === null) return outer;
  const under = judgeContents(style.contents, wish, menu);
  return byLevel(outer.level, under.level) > 0 ? outer : under;
}
