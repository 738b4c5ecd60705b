/** Markup that is ready to be sent: whatever came from outside has been escaped. */
export class Html {
  constructor(readonly markup: string) {}
}

export type HtmlValue = string | number | Html | readonly Html[];

/** A template whose values are escaped unless they are markup already. */
export function html(strings: TemplateStringsArray, ...values: HtmlValue[]): Html {
  let markup = strings[0] ?? '';
  values.forEach((value, index) => {
    markup += markupOf(value) + (strings[index + 1] ?? '');
  });
  return new Html(markup);
}

/** Text of several lines: every line break of it is kept. */
export function htmlLines(text: string): Html {
  const lines = text.split('\n').map((line) => escape(line));
  return new Html(lines.join('<br>\n'));
}

function markupOf(value: HtmlValue): string {
  if (value instanceof Html) return value.markup;
  if (typeof value === 'object') return value.map(({ markup }) => markup).join('\n');
  return escape(String(value));
}

const entities: Readonly<Record<string, string>> = {
  '&': '&amp;',
  '<': '&lt;',
  '>': '&gt;',
  '"': '&quot;',
  "'": '&#39;',
};

function escape(text: string): string {
  return text.replaceAll(/[&<>"']/g, (character) => entities[character] ?? '');
}
