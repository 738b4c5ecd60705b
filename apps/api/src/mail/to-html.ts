import type { Block, DrawnTier, MailBody, NoticeTone } from './content.ts';
import { Html, html, htmlLines } from './html.ts';
import { nameInText, proseOf } from './plain.ts';
import type { House } from './house.ts';

/*
 * Tables, inline styles and colours written out on every element: what mail programs agree on.
 * Nothing is fetched from anywhere. Colours are the house's tokens; for dark rooms the style sheet
 * gives each its counterpart, and a program that inverts by itself finds both a text and a ground
 * wherever there is one.
 */
const ink = '#14203D';
const slate = '#566179';
const cobalt = '#23429A';
const enamel = '#FFFFFF';
const cloud = '#F2F5F9';
const seam = '#D5DCE8';

const tones: Readonly<Record<NoticeTone, { ground: string; edge: string }>> = {
  now: { ground: '#FFF5D3', edge: '#F2B632' },
  stop: { ground: '#FBE6E9', edge: '#B3263E' },
  quiet: { ground: cloud, edge: seam },
};

const sans = "-apple-system, 'Segoe UI', Roboto, 'Helvetica Neue', Arial, sans-serif";
const display =
  "'Avenir Next', 'Segoe UI Semibold', 'Trebuchet MS', 'Helvetica Neue', Arial, sans-serif";
const body = `font-family: ${sans}; font-size: 16px; line-height: 24px; color: ${ink};`;
const small = `font-family: ${sans}; font-size: 14px; line-height: 21px; color: ${slate};`;

const styleSheet = new Html(`
  :root { color-scheme: light dark; supported-color-schemes: light dark; }
  body { margin: 0; padding: 0; }
  a { word-break: break-word; }
  @media (max-width: 480px) {
    .edge { padding-left: 20px !important; padding-right: 20px !important; }
    .press { display: block !important; text-align: center !important; }
  }
  @media (prefers-color-scheme: dark) {
    .ground { background-color: #0B1226 !important; }
    .card { background-color: #14203D !important; border-color: #8FA8F0 !important; }
    .ink { color: #F2F5F9 !important; }
    .slate { color: #B4BED2 !important; }
    .link { color: #B7C8FF !important; }
    .seam { border-color: #3A4970 !important; }
    .press { background-color: #B7C8FF !important; border-color: #B7C8FF !important; color: #14203D !important; }
    .now { background-color: #3B3212 !important; }
    .stop { background-color: #4A1722 !important; }
    .quiet { background-color: #1D2B4F !important; border-color: #3A4970 !important; }
    .drawn { border-color: #8FA8F0 !important; }
    .board { background-color: #8FA8F0 !important; }
  }`);

/** The whole mail as HTML. */
export function toHtml(
  content: MailBody & { readonly lead: string; readonly closing: string },
  house: House,
): string {
  const { studio } = house;
  const blocks = content.blocks.map((block) => row(blockHtml(block)));
  const closing = content.closing === '' ? [] : [row(paragraphs(content.closing))];
  const page = html`<!doctype html>
    <html lang="${studio.locale}">
      <head>
        <meta charset="utf-8" />
        <meta name="viewport" content="width=device-width, initial-scale=1" />
        <meta name="color-scheme" content="light dark" />
        <meta name="supported-color-schemes" content="light dark" />
        <meta name="format-detection" content="telephone=no, date=no, address=no" />
        <title>${content.title}</title>
        <style>
          ${styleSheet}
        </style>
      </head>
      <body class="ground" style="margin: 0; padding: 0; background-color: ${cloud};">
        <div style="display: none; max-height: 0; overflow: hidden;">${content.preview}</div>
        <table
          role="presentation"
          class="ground"
          width="100%"
          cellpadding="0"
          cellspacing="0"
          border="0"
          style="background-color: ${cloud};"
        >
          <tr>
            <td align="center" style="padding: 24px 8px;">
              <table
                role="presentation"
                class="card"
                width="600"
                cellpadding="0"
                cellspacing="0"
                border="0"
                style="width: 100%; max-width: 600px; background-color: ${enamel}; border: 2px solid ${cobalt}; border-radius: 14px; border-collapse: separate;"
              >
                ${row(head(content, house), '24px')}
                ${row(html`<h1 class="ink" style="margin: 0; font-family: ${display}; font-size: 28px; line-height: 34px; font-weight: 700; color: ${ink};">${content.title}</h1>`)}
                ${row(paragraphs(content.lead))} ${blocks} ${closing}
                ${row(foot(content, house), '20px', '28px')}
              </table>
            </td>
          </tr>
        </table>
      </body>
    </html> `;
  return page.markup;
}

function row(content: Html, above = '16px', below = '0'): Html {
  return html`<tr>
    <td class="edge" style="padding: ${above} 32px ${below} 32px;">${content}</td>
  </tr>`;
}

function head({ order }: MailBody, { studio }: House): Html {
  const number = order === undefined ? '' : `No. ${order.number}`;
  return html`<table role="presentation" width="100%" cellpadding="0" cellspacing="0" border="0">
    <tr>
      <td
        class="ink"
        style="font-family: ${display}; font-size: 16px; line-height: 24px; font-weight: 700; color: ${ink};"
      >
        ${studio.name}
      </td>
      <td class="slate" align="right" style="${small} white-space: nowrap;">${number}</td>
    </tr>
  </table>`;
}

function foot({ order, footnote }: MailBody, { studio }: House): Html {
  const about =
    order === undefined
      ? []
      : [html`Order No. ${order.number}: ${link(order.link, 'open its page')}<br />`];
  const why = footnote === undefined ? [] : [html`<br />${footnote}`];
  return html`<div
    class="slate seam"
    style="${small} border-top: 1px solid ${seam}; padding-top: 16px;"
  >
    ${about}
    <span class="ink" style="color: ${ink}; font-weight: 600;">${studio.name}</span>,
    ${studio.address}<br />
    ${link(`tel:${studio.phone.replaceAll(/[^+\d]/g, '')}`, studio.phone)} &middot;
    ${link(`mailto:${studio.email}`, studio.email)} ${why}
  </div>`;
}

function link(url: string, label: string): Html {
  return html`<a class="link" href="${url}" style="color: ${cobalt}; text-decoration: underline;"
    >${label}</a
  >`;
}

/** @param dir `auto` for words of somebody who may write from right to left */
function paragraphs(words: string, dir: 'ltr' | 'auto' = 'ltr'): Html {
  const parts = words.split(/\n{2,}/).filter((part) => part !== '');
  const last = parts.length - 1;
  return html`${parts.map(
    (part, index) =>
      html`<p class="ink" dir="${dir}" style="margin: 0 0 ${index === last ? 0 : 12}px 0; ${body}">
        ${htmlLines(part)}
      </p>`,
  )}`;
}

function blockHtml(block: Block): Html {
  switch (block.kind) {
    case 'text':
      return paragraphs(block.text);
    case 'heading':
      return html`<h2
        class="ink"
        style="margin: 8px 0 0 0; font-family: ${display}; font-size: 19px; line-height: 26px; font-weight: 700; color: ${ink};"
      >
        ${block.text}
      </h2>`;
    case 'notice':
      return noticeHtml(block);
    case 'facts':
      return table(block.facts.map(({ label, value }) => factRow(label, value)));
    case 'prices':
      return table([
        ...block.lines.map(({ label, value }) => priceRow(label, value)),
        priceRow(block.total.label, block.total.value, true),
      ]);
    case 'button':
      return html`<a
        class="press"
        href="${block.url}"
        style="display: inline-block; padding: 13px 22px; background-color: ${cobalt}; border: 2px solid ${cobalt}; border-radius: 10px; color: ${enamel}; font-family: ${sans}; font-size: 16px; line-height: 20px; font-weight: 600; text-decoration: none;"
        >${block.label}</a
      >`;
    case 'list':
      return listHtml(block);
    case 'quote':
      return quoteHtml(block);
    case 'drawing':
      return drawingHtml(block.tiers, block.label);
  }
}

function noticeHtml({ tone, title, text }: Extract<Block, { kind: 'notice' }>): Html {
  const { ground, edge } = tones[tone];
  return html`<div
    class="${tone}"
    style="background-color: ${ground}; border-left: 4px solid ${edge}; border-radius: 4px; padding: 12px 16px;"
  >
    <p class="ink" style="margin: 0 0 2px 0; ${body} font-weight: 700;">${title}</p>
    ${paragraphs(text)}
  </div>`;
}

function table(rows: readonly Html[]): Html {
  return html`<table
    role="presentation"
    width="100%"
    cellpadding="0"
    cellspacing="0"
    border="0"
    style="border-collapse: collapse;"
  >
    ${rows}
  </table>`;
}

/** A label narrow beside its value, so that both stand on a telephone. */
function factRow(label: string, value: string): Html {
  return html`<tr>
    <td
      class="slate seam"
      width="30%"
      valign="top"
      style="${small} padding: 7px 12px 7px 0; border-bottom: 1px solid ${seam};"
    >
      ${label}
    </td>
    <td
      class="ink seam"
      valign="top"
      dir="auto"
      style="${body} font-size: 15px; line-height: 22px; padding: 7px 0; border-bottom: 1px solid ${seam};"
    >
      ${htmlLines(value)}
    </td>
  </tr>`;
}

function priceRow(label: string, value: string, total = false): Html {
  const weight = total ? 'font-weight: 700;' : 'font-weight: 400;';
  const line = total ? '' : `border-bottom: 1px solid ${seam};`;
  const style = `${body} font-size: 15px; line-height: 22px; ${weight} ${line}`;
  return html`<tr>
    <td class="ink seam" valign="top" style="${style} padding: 7px 12px 7px 0;">${label}</td>
    <td
      class="ink seam"
      valign="top"
      align="right"
      style="${style} padding: 7px 0; white-space: nowrap; font-variant-numeric: tabular-nums;"
    >
      ${value}
    </td>
  </tr>`;
}

function listHtml({ items }: Extract<Block, { kind: 'list' }>): Html {
  const entries = items.map(
    ({ text, url }) =>
      html`<li class="ink" style="margin: 0 0 6px 0; ${body}">
        ${url === undefined ? text : link(url, text)}
      </li>`,
  );
  return html`<ul style="margin: 0; padding: 0 0 0 22px;">
    ${entries}
  </ul>`;
}

function quoteHtml({ by, text }: Extract<Block, { kind: 'quote' }>): Html {
  return html`<div
    class="quiet"
    style="background-color: ${cloud}; border-left: 4px solid ${cobalt}; border-radius: 4px; padding: 12px 16px;"
  >
    <p class="slate" style="margin: 0 0 4px 0; ${small}"><bdi>${nameInText(by)}</bdi></p>
    ${paragraphs(proseOf(text), 'auto')}
  </div>`;
}

/** Pixels across the widest tier, and the tallest a drawing may be. */
const drawnWidth = 200;
const drawnHeight = 150;

/** Tiers as coloured cells over a board, to scale; it needs no picture to be fetched. */
function drawingHtml(tiers: readonly DrawnTier[], label: string): Html {
  const widest = Math.max(...tiers.map(({ widthMm }) => widthMm), 1);
  const tall = tiers.reduce((sum, { heightMm }) => sum + heightMm, 0);
  const scale = Math.min(drawnWidth / widest, drawnHeight / Math.max(tall, 1));
  const px = (mm: number): number => Math.max(6, Math.round(mm * scale));
  const cells = tiers.toReversed().map(
    ({ widthMm, heightMm, colour }) =>
      html`<tr>
        <td align="center">
          <div
            class="drawn"
            style="width: ${px(widthMm)}px; height: ${px(heightMm)}px; background-color: ${hexOf(colour)}; border: 2px solid ${cobalt}; border-bottom-width: 0; border-radius: 5px 5px 0 0; font-size: 0; line-height: 0;"
          >
            &nbsp;
          </div>
        </td>
      </tr>`,
  );
  return html`<table
    role="img"
    aria-label="${label}"
    class="quiet"
    width="100%"
    cellpadding="0"
    cellspacing="0"
    border="0"
    style="background-color: ${cloud}; border-radius: 10px;"
  >
    <tr>
      <td style="height: 16px; font-size: 0; line-height: 0;">&nbsp;</td>
    </tr>
    ${cells}
    <tr>
      <td align="center">
        <div
          class="board"
          style="width: ${px(widest) + 40}px; height: 5px; background-color: ${cobalt}; border-radius: 3px; font-size: 0; line-height: 0;"
        >
          &nbsp;
        </div>
      </td>
    </tr>
    <tr>
      <td style="height: 16px; font-size: 0; line-height: 0;">&nbsp;</td>
    </tr>
  </table>`;
}

/** A colour that may stand in a style, where escaping alone would not do. */
function hexOf(colour: string): string {
  return /^#[0-9a-f]{6}$/i.test(colour) ? colour : enamel;
}
