import type { Html } from '#fakes/harness/html.ts';
import { html, linked, page, readable } from '#fakes/harness/html.ts';
import type { PlannedFailure } from '#fakes/harness/failure-queue.ts';
import type { MailMessage, SmtpFailure } from './wire.ts';

const standsInFor = 'Mailbox';

const kinds = [
  ['defer', 'Answer “try again later” (451)'],
  ['refuse', 'Refuse the recipient for good (550)'],
  ['refuse-connection', 'Refuse the connection (421)'],
  ['drop-after-data', 'Cut the line before the answer'],
  ['slow', 'Take ten seconds to answer'],
] as const;

function subjectOf({ subject }: MailMessage): string {
  return subject === '' ? '(no subject)' : subject;
}

function withAttachment({ attachments }: MailMessage): string {
  return attachments.some(({ inline }) => !inline) ? ', with attachment' : '';
}

function failureForm(waiting: PlannedFailure<SmtpFailure>[]): Html {
  const planned = waiting.map(
    ({ failure, times }) =>
      html`<li>${failure.kind}, ${times} more ${times === 1 ? 'time' : 'times'}</li>`,
  );
  return html`
    <details ${waiting.length > 0 && 'open'}>
      <summary>Let sending fail</summary>
      <form class="line" method="post" action="/fail">
        <label
          >How
          <select name="kind">
            ${kinds.map(([value, label]) => html`<option value="${value}">${label}</option>`)}
          </select></label
        >
        <label>How often <input name="times" type="number" min="1" value="1" /></label>
        <button class="main">Let it fail</button>
      </form>
      ${
        planned.length > 0 &&
        html`<ul>
            ${planned}
          </ul>
          <form method="post" action="/work">
            <button>Let it work again</button>
          </form>`
      }
    </details>
  `;
}

/** Every message, newest first, and a form to let sending fail. */
export function mailboxPage(
  messages: MailMessage[],
  waiting: PlannedFailure<SmtpFailure>[],
): string {
  const rows = messages.toReversed().map(
    (message) => html`
      <li>
        <a href="/messages/${message.id}">${subjectOf(message)}</a>
        <div>to ${message.to.join(', ')}</div>
        <div class="quiet">
          from ${message.from}, ${readable(message.receivedAt)}${withAttachment(message)}
        </div>
      </li>
    `,
  );
  return page({
    title: 'Mailbox',
    standsInFor,
    scriptSrc: '/mailbox.js',
    body: html`
      <h1>Messages</h1>
      <ol class="rows rim" data-count="${messages.length}">
        ${rows.length === 0 ? html`<li>None yet.</li>` : rows}
      </ol>
      ${failureForm(waiting)}
    `,
  });
}

/** Shows new messages by itself, unless somebody is filling in the form. */
export const mailboxScript = `
  const shown = document.querySelector('[data-count]').dataset.count;
  setInterval(async () => {
    if (document.hidden || document.activeElement.closest('form')) return;
    const response = await fetch('/api/messages/count').catch(() => undefined);
    if (response?.ok && (await response.text()) !== shown) location.reload();
  }, 3000);
`;

function attachmentList(message: MailMessage): Html {
  return html`<ul>
    ${message.attachments.map(
      (attachment, index) =>
        html`<li>
          <a href="/messages/${message.id}/attachments/${index}">${attachment.filename}</a>
          <span class="quiet">${attachment.contentType}, ${attachment.size} bytes</span>
        </li>`,
    )}
  </ul>`;
}

/** One message: as HTML in a sandboxed frame, as text, its attachments and its headers. */
export function messagePage(message: MailMessage): string {
  return page({
    title: subjectOf(message),
    standsInFor,
    body: html`
      <p><a href="/">All messages</a></p>
      <h1>${subjectOf(message)}</h1>
      <p>
        From ${message.from}<br />
        To ${message.to.join(', ')}<br />
        <span class="quiet">Received ${readable(message.receivedAt)}</span>
      </p>
      ${
        message.html !== null &&
        html`<div class="rim">
          <iframe
            title="The message as HTML"
            src="/messages/${message.id}/html"
            sandbox="allow-popups allow-popups-to-escape-sandbox"
          ></iframe>
        </div>`
      }
      ${
        message.attachments.length > 0 &&
        html`<h2>Attachments</h2>
          ${attachmentList(message)}`
      }
      <h2>Text</h2>
      <pre>${linked(message.text)}</pre>
      <h2>Headers</h2>
      <table>
        ${message.headers.map(
          ({ name, value }) =>
            html`<tr>
              <th>${name}</th>
              <td>${value}</td>
            </tr>`,
        )}
      </table>
      <p><a href="/messages/${message.id}/raw">The message as it arrived</a></p>
    `,
  });
}
