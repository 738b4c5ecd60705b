import { createHash } from 'node:crypto';
import * as z from 'zod/mini';
import { errorTitles } from '#shared/errors.ts';
import { statusOf } from './problem.ts';
import type { RouteContract } from './route.ts';

const style = `
body { margin: 0 auto; max-width: 60rem; padding: 1.5rem; font: 1rem/1.5 system-ui, sans-serif; color: #2a2320; background: #fdfaf6; }
h1, h2 { line-height: 1.2; }
details { border-top: 1px solid #d9cec2; padding: .6rem 0; }
summary { cursor: pointer; display: grid; grid-template-columns: 4rem 1fr; gap: 0 .75rem; }
summary span:last-child { grid-column: 2; color: #5d514a; }
.method { text-transform: uppercase; font-weight: 650; }
code, pre { font: .875rem/1.5 ui-monospace, monospace; overflow-wrap: anywhere; }
pre { background: #f3ebe1; padding: .75rem; overflow: auto; border-radius: .375rem; }
table { border-collapse: collapse; }
th, td { text-align: left; padding: .25rem 1rem .25rem 0; vertical-align: top; }
a { color: #7a2e3a; }
@media (prefers-color-scheme: dark) {
  body { color: #efe7df; background: #1d1917; }
  details { border-color: #4a413b; }
  summary span:last-child { color: #bcafa5; }
  pre { background: #2b2522; }
  a { color: #e7a3ad; }
}
`;

/** What the page's Content-Security-Policy lets through: this style and nothing else. */
export const apiPageStyleHash = `sha256-${createHash('sha256').update(style).digest('base64')}`;

function escape(text: string): string {
  return text
    .replaceAll('&', '&amp;')
    .replaceAll('<', '&lt;')
    .replaceAll('>', '&gt;')
    .replaceAll('"', '&quot;');
}

function shown(title: string, schema: z.ZodMiniType | undefined, io: 'input' | 'output'): string {
  if (schema === undefined) return '';
  const { $schema: _, ...rest } = z.toJSONSchema(schema, { io, unrepresentable: 'any' });
  return `<h3>${title}</h3><pre tabindex="0">${escape(JSON.stringify(rest, null, 2))}</pre>`;
}

function entry(contract: RouteContract): string {
  const refusals = (contract.refusals ?? [])
    .map((code) => `<a href="#${code}"><code>${code}</code></a>`)
    .join(' ');
  return `<details id="${contract.name}">
<summary><span class="method">${contract.method}</span><code>${escape(contract.path)}</code><span>${escape(contract.summary)}</span></summary>
${shown('In the address', contract.params, 'input')}
${shown('In the query', contract.query, 'input')}
${contract.upload === undefined ? '' : `<p>A form with the file in <code>${contract.upload}</code>.</p>`}
${contract.idempotent ? '<p>Needs an <code>Idempotency-Key</code>.</p>' : ''}
${shown('Body', contract.body, 'input')}
${shown(`Answer ${contract.status ?? 200}`, contract.response, 'output')}
${contract.produces === undefined ? '' : `<p>Answers <code>${escape(contract.produces)}</code>.</p>`}
${refusals === '' ? '' : `<p>Refusals of its own: ${refusals}</p>`}
</details>`;
}

function codeRow([code, title]: [string, string], status: number): string {
  return `<tr id="${code}"><td>${status}</td><td><code>${code}</code></td><td>${escape(title)}</td></tr>`;
}

/** The API for reading, by people without tools: no script, nothing loaded. */
export function apiPage(declared: readonly RouteContract[]): string {
  const statuses: Readonly<Record<string, number>> = statusOf;
  const codes = Object.entries(errorTitles).map((pair) => codeRow(pair, statuses[pair[0]] ?? 500));
  return `<!doctype html>
<html lang="en">
<head><meta charset="utf-8"><meta name="viewport" content="width=device-width, initial-scale=1">
<title>Tierwell: the API</title><style>${style}</style></head>
<body><main>
<h1>Tierwell: the API</h1>
<p>The same as <a href="/api/openapi.json">OpenAPI 3.1</a>. Whatever changes something needs the site's
own <code>Origin</code> and the header <code>X-Tierwell</code>. Amounts are minor units, lengths
millimetres, instants UTC, days <code>YYYY-MM-DD</code>, times of day minutes since midnight.</p>
<h2>Requests</h2>
${declared.map(entry).join('\n')}
<h2>Refusals</h2>
<p>Each is a problem in the manner of RFC 9457 (<code>application/problem+json</code>) with a
<code>code</code>, and where answers need another look, <code>issues</code> with their paths.</p>
<table><thead><tr><th>Status</th><th>Code</th><th>Title</th></tr></thead><tbody>
${codes.join('\n')}
</tbody></table>
</main></body></html>
`;
}
