import type { Block, Fact, MailBody } from './content.ts';
import type { House } from './house.ts';
import { nameInText, proseOf, wrap } from './plain.ts';

const line = '-'.repeat(40);

/** The whole mail as plain text, made for reading: addresses stand alone on their lines. */
export function toText(
  content: MailBody & { readonly lead: string; readonly closing: string },
  house: House,
): string {
  const { order, footnote } = content;
  const { studio } = house;
  const parts = [
    `${content.title}\n${'='.repeat(content.title.length)}`,
    paragraphs(content.lead),
    ...content.blocks.map(blockText),
    ...(content.closing === '' ? [] : [paragraphs(content.closing)]),
    [
      line,
      ...(order === undefined ? [] : [`Order No. ${order.number}:`, order.link, '']),
      studio.name,
      studio.address,
      `${studio.phone}, ${studio.email}`,
      ...(footnote === undefined ? [] : ['', ...wrap(footnote)]),
    ].join('\n'),
  ];
  return `${parts.filter((part) => part !== '').join('\n\n')}\n`;
}

function paragraphs(words: string): string {
  return wrap(words).join('\n');
}

function blockText(block: Block): string {
  switch (block.kind) {
    case 'text':
      return paragraphs(block.text);
    case 'heading':
      return `${block.text}\n${'-'.repeat(block.text.length)}`;
    case 'notice':
      return [`* ${block.title}`, ...wrap(block.text, 70).map((each) => `  ${each}`)].join('\n');
    case 'facts':
      return aligned(block.facts);
    case 'prices':
      return priced([...block.lines, block.total]);
    case 'button':
      return `${block.label}:\n${block.url}`;
    case 'list':
      return block.items.map(item).join('\n');
    case 'quote':
      return [
        `${nameInText(block.by)}:`,
        ...wrap(proseOf(block.text), 70).map((each) => `> ${each}`.trimEnd()),
      ].join('\n');
    case 'drawing':
      return '';
  }
}

function item({ text, url }: { readonly text: string; readonly url?: string }): string {
  const [first = '', ...rest] = wrap(text, 70);
  const lines = [`- ${first}`, ...rest.map((each) => `  ${each}`)];
  return [...lines, ...(url === undefined ? [] : [`  ${url}`])].join('\n');
}

/** Labels in one column, values in the next, longer ones going on under themselves. */
function aligned(facts: readonly Fact[]): string {
  const width = Math.max(...facts.map(({ label }) => label.length), 0) + 2;
  return facts
    .flatMap(({ label, value }) =>
      wrap(value, 72 - width).map(
        (each, index) => `${(index === 0 ? `${label}:` : '').padEnd(width)}${each}`,
      ),
    )
    .join('\n');
}

/** Amounts end in one column. */
function priced(lines: readonly Fact[]): string {
  const labels = Math.min(50, Math.max(...lines.map(({ label }) => label.length), 0));
  const amounts = Math.max(...lines.map(({ value }) => value.length), 0);
  return lines
    .flatMap(({ label, value }) => {
      const wrapped = wrap(label, labels);
      const last = wrapped.pop() ?? '';
      return [...wrapped, `${last.padEnd(labels)}  ${value.padStart(amounts)}`];
    })
    .join('\n');
}
