import type { Html } from '#fakes/harness/html.ts';
import { html, page, readable } from '#fakes/harness/html.ts';
import { people } from './people.ts';

const standsInFor = 'Google sign-in';

const outcomes = [
  ['', 'No, let it work'],
  ['bad-code', 'The code that comes back is refused'],
  ['slow-token', 'The answer takes ten seconds'],
  ['unverified-email', 'The address is not verified'],
  ['token-error', 'The service breaks after the choice'],
] as const;

function account(name: string, email: string): Html {
  return html`<button class="row" name="email" value="${email}">
    ${name}<span>${email}</span>
  </button>`;
}

/** The account chooser; `key` is the held request that the choice belongs to. */
export function chooserPage(key: string, returnsTo: string): string {
  return page({
    title: 'Who is signing in?',
    standsInFor,
    narrow: true,
    body: html`
      <form method="post" action="/o/oauth2/v2/auth/choose" class="rim padded">
        <h1>Who is signing in?</h1>
        <p class="quiet">Afterwards you are back at ${returnsTo}. The people are invented.</p>
        <input type="hidden" name="key" value="${key}" />
        <!-- What Enter presses: the address being typed, not the first person below. -->
        <button name="other" value="yes" hidden>Go on</button>
        <label
          >Should something go wrong?
          <select name="outcome">
            ${outcomes.map(([value, label]) => html`<option value="${value}">${label}</option>`)}
          </select></label
        >
        ${people.map((person) => account(`${person.givenName} ${person.familyName}`, person.email))}
        <details>
          <summary>Use another address</summary>
          <label>E-mail address <input name="otherEmail" type="email" autocomplete="off" /></label>
          <label>Name <input name="otherName" autocomplete="off" /></label>
          <button class="main" name="other" value="yes">Go on with this address</button>
        </details>
        <button name="deny" value="yes">Say no</button>
      </form>
    `,
  });
}

/** What a browser sees where the request itself is wrong and nobody can be sent back. */
export function refusalPage(error: string, description: string): string {
  return page({
    title: 'This request is refused',
    standsInFor,
    narrow: true,
    body: html`<div class="rim padded">
      <h1>This request is refused</h1>
      <p>${description}</p>
      <p class="quiet">Error 400: ${error}</p>
    </div>`,
  });
}

/** The page at `/`: what this is, and the calls so far, newest first. */
export function overviewPage(
  calls: {
    at: string;
    endpoint: string;
    status: number;
    outcome: string;
    email?: string;
  }[],
): string {
  const rows = calls.map(
    (call) =>
      html`<tr>
        <td>${readable(call.at)}</td>
        <td>${call.endpoint}</td>
        <td>${call.status}</td>
        <td>${call.outcome}</td>
        <td>${call.email}</td>
      </tr>`,
  );
  return page({
    title: 'Calls to the Google stand-in',
    standsInFor,
    body: html`
      <h1>Calls</h1>
      <p class="quiet">Press “Sign in with Google” in the app to come to the account chooser.</p>
      <div class="rim wide">
        <table>
          <tr>
            <th>When</th>
            <th>Endpoint</th>
            <th>Status</th>
            <th>Outcome</th>
            <th>Account</th>
          </tr>
          ${
            rows.length === 0
              ? html`<tr>
                  <td colspan="5">None yet.</td>
                </tr>`
              : rows
          }
        </table>
      </div>
    `,
  });
}
