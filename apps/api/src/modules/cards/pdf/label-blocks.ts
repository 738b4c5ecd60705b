import type { LabelText } from '#shared/contracts/cards.ts';
import { formatDay } from '#shared/dates/format.ts';
import { paper } from './ink.ts';
import type { Block, Run } from './text-flow.ts';

/** The words of a label as paragraphs, in the order they are set, at one size of type. */
export function labelBlocks(label: LabelText, size: number): Block[] {
  const text = (words: string): Run => ({ text: words, font: 'text', size, colour: paper.ink });
  const strong = (words: string): Run => ({ text: words, font: 'strong', size, colour: paper.ink });
  const gap = size * 0.3;
  const maybe = (words: string | null): Block[] =>
    words === null || words === '' ? [] : [{ runs: [text(words)], gap, together: words }];
  // The list and what it contains are read as one and not parted (21 CFR 101.2(e), FALCPA).
  const contents = (...runs: readonly Run[]): Block => ({ runs, gap, together: 'contents' });
  const warned = (words: string | null): Block[] =>
    words === null || words === '' ? [] : [contents(strong(words))];
  return [
    {
      runs: [{ text: label.studio.name, font: 'display', size: size * 1.3, colour: paper.cobalt }],
      gap: 0,
    },
    { runs: [strong(label.product)], gap: 0 },
    { runs: [text(label.about)], gap: 0 },
    contents(
      strong('Ingredients: '),
      ...label.ingredients.map((it) => (it.emphasised ? strong(it.text) : text(it.text))),
    ),
    ...warned(label.contains),
    ...label.notKnown.flatMap(warned),
    ...warned(label.mayContain),
    ...maybe(together(label.makersWarn, label.kitchen, label.signpost)),
    ...maybe(together(...label.keep)),
    ...maybe(together(...label.remove)),
    ...maybe(together(...label.cautions)),
    ...maybe(label.homeKitchen),
    ...maybe(`${label.studio.name}, ${label.studio.address}`),
  ];
}

/** Sentences of one kind share a paragraph: a label has little room. */
function together(...sentences: readonly (string | null)[]): string {
  return sentences.filter((it) => it !== null && it !== '').join(' ');
}

/** "Use by 21 June 2027", "Made on 18 June 2027"; the one that matters first. */
export function labelDates(label: LabelText, locale: string): string[] {
  const day = (date: string) => formatDay(date, { locale, year: true, weekday: false });
  return [
    ...(label.useBy === null ? [] : [`Use by ${day(label.useBy)}`]),
    ...(label.madeOn === null ? [] : [`Made on ${day(label.madeOn)}`]),
  ];
}
