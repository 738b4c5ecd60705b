/** Markup that has been escaped already and may stand in a page as it is. */
export class Html {
  constructor(readonly markup: string) {}

  toString(): string {
    return this.markup;
  }
}

type Value = string | number | Html | Html[] | undefined | false;

const entities: Record<string, string> = {
  '&': '&amp;',
  '<': '&lt;',
  '>': '&gt;',
  '"': '&quot;',
  "'": '&#39;',
};

function escaped(text: string): string {
  return text.replace(/[&<>"']/g, (character) => entities[character] ?? character);
}

function rendered(value: Value): string {
  if (value === undefined || value === false) return '';
  if (Array.isArray(value)) return value.join('');
  return value instanceof Html ? value.markup : escaped(String(value));
}

/** A template tag that escapes everything put into it except markup it made itself. */
export function html(strings: TemplateStringsArray, ...values: Value[]): Html {
  return new Html(
    strings.map((string, index) => string + rendered(values[index] ?? undefined)).join(''),
  );
}

/** An instant as people read it, to the second and in UTC. */
export function readable(instant: string): string {
  const date = new Date(instant).toLocaleString('en-GB', {
    dateStyle: 'medium',
    timeStyle: 'medium',
    timeZone: 'UTC',
  });
  return `${date} UTC`;
}

/** Escaped text in which http(s) addresses are links that open in a new tab. */
export function linked(text: string): Html {
  const parts = text.split(/(https?:\/\/[^\s<>"']+)/g);
  return html`${parts.map((part, index) =>
    index % 2 === 1
      ? html`<a href="${part}" target="_blank" rel="noopener noreferrer">${part}</a>`
      : html`${part}`,
  )}`;
}

const style = `
  *, ::before, ::after { box-sizing: border-box }
  body { margin: 0; background: #fff; color: #14203d; font: 16px/1.5 system-ui, sans-serif }
  header { display: flex; flex-wrap: wrap; gap: 4px 16px; align-items: baseline;
    padding: 12px 24px; border-bottom: 1px solid #d5dce8 }
  header strong { font-size: 18px } header span { color: #566179 }
  main { max-width: 960px; margin: 0 auto; padding: 24px }
  main.narrow { max-width: 480px }
  h1 { font-size: 24px; line-height: 1.2; margin: 0 0 16px } h2 { font-size: 18px; margin: 32px 0 8px }
  a { color: #23429a } p { margin: 0 0 12px } .quiet { color: #566179 } details { margin-bottom: 16px }
  .rim { border: 2px solid #23429a; border-radius: 14px; overflow: hidden }
  .padded { padding: 24px }
  table { border-collapse: collapse; width: 100% }
  th, td { padding: 8px 12px; text-align: left; vertical-align: top; border-bottom: 1px solid #d5dce8;
    overflow-wrap: anywhere }
  th { color: #566179; font-weight: 500 } tr:last-child > * { border-bottom: 0 }
  .wide { overflow-x: auto } .wide th, .wide td { white-space: nowrap }
  ol.rows { list-style: none; margin: 0; padding: 0 }
  ol.rows > li { padding: 12px 24px; overflow-wrap: anywhere; border-bottom: 1px solid #d5dce8 }
  ol.rows > li:last-child { border-bottom: 0 } ol.rows a { font-weight: 500 }
  pre { margin: 0; white-space: pre-wrap; overflow-wrap: anywhere; font: 14px/1.5 ui-monospace, monospace }
  iframe { display: block; width: 100%; height: 70vh; border: 0; background: #fff }
  button, input, select { font: inherit; color: inherit; min-height: 44px; border-radius: 10px;
    border: 1px solid #566179; background: #fff; padding: 8px 14px; max-width: 100% }
  button { cursor: pointer } button.main { background: #23429a; border-color: #23429a; color: #fff }
  button.row { display: block; width: 100%; text-align: left; border-color: #d5dce8; margin-bottom: 8px }
  button.row:hover { background: #e7ecf8 } button.row span { display: block; color: #566179 }
  label { display: block; font-weight: 500; margin-bottom: 12px }
  label input, label select { display: block; width: 100%; margin-top: 4px; font-weight: 400 }
  form.line { display: flex; flex-wrap: wrap; gap: 8px; align-items: end } form.line label { margin: 0 }
  summary { cursor: pointer; padding: 12px 0; min-height: 44px }
  :focus-visible { outline: 3px solid #23429a; outline-offset: 2px }
`;

/** A whole page in the fakes' plain dress; every page says that it is a stand-in. */
export function page(options: {
  title: string;
  standsInFor: string;
  narrow?: boolean;
  body: Html;
  scriptSrc?: string;
}): string {
  return html`<!doctype html>
    <html lang="en">
      <head>
        <meta charset="utf-8" />
        <meta name="viewport" content="width=device-width, initial-scale=1" />
        <link rel="icon" href="data:," />
        <title>${options.title}</title>
        <style>
          ${new Html(style)}
        </style>
      </head>
      <body>
        <header>
          <strong>${options.standsInFor}</strong>
          <span>Stand-in. Runs on this computer only; nothing here reaches the outside.</span>
        </header>
        <main class="${options.narrow === true ? 'narrow' : ''}">${options.body}</main>
        ${options.scriptSrc !== undefined && html`<script src="${options.scriptSrc}"></script>`}
      </body>
    </html>`.markup;
}
