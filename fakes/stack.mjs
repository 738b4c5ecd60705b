/*
 * The whole of Tierwell on this computer: the fakes, then the application pointed at them. What
 * `npm run demo` and `npm run dev` share.
 */
import { randomBytes } from 'node:crypto';
import { existsSync } from 'node:fs';
import { mkdir, readdir, rm, writeFile } from 'node:fs/promises';
import { createServer } from 'node:net';
import path from 'node:path';
import { setTimeout as pause } from 'node:timers/promises';
import { createChildren } from './children.mjs';
import { Unready, root } from './prepare.mjs';

const defaultPort = 4100;
const defaultData = path.join(root, '.data/demo');
/** Lies in every data folder that we made ourselves and may therefore remove. */
const markerName = '.tierwell-demo';
const readyWithinMs = 180_000;
const lookAgainMs = 200;

/** Ports: the app's, then the mailbox's, SMTP's, Google's and, while developing, the API's. */
function portsFrom(text) {
  const app = text === undefined || text === '' ? defaultPort : Number(text);
  if (!Number.isInteger(app) || app < 1 || app > 65_531) {
    throw new Unready(`PORT must be a whole number from 1 to 65531; it is "${text}".`);
  }
  return { app, mailbox: app + 1, smtp: app + 2, google: app + 3, api: app + 4 };
}

function isFree(port) {
  return new Promise((resolve) => {
    const probe = createServer();
    probe.once('error', () => resolve(false));
    probe.listen(port, '127.0.0.1', () => probe.close(() => resolve(true)));
  });
}

async function requireFree(ports, script) {
  const taken = [];
  for (const [whose, port] of Object.entries(ports)) {
    if (!(await isFree(port))) taken.push(`${port} (${whose})`);
  }
  if (taken.length === 0) return;
  throw new Unready(
    `Taken by another program: port ${taken.join(', port ')}. ` +
      `Choose other ports: PORT=${ports.app + 100} npm run ${script}`,
  );
}

/** Makes the data folder; with `reset` empties it first, unless it holds what is not ours. */
async function prepareData(data, reset) {
  const marker = path.join(data, markerName);
  const isEmpty = !existsSync(data) || (await readdir(data)).length === 0;
  if (reset && !isEmpty) {
    if (data !== defaultData && !existsSync(marker)) {
      throw new Unready(`${data} was not made by the demo, so --reset leaves it alone.`);
    }
    await rm(data, { recursive: true });
  }
  await mkdir(path.join(data, 'logs'), { recursive: true });
  if (reset || isEmpty)
    await writeFile(marker, 'Made by the demo, which may remove this folder.\n');
}

/** Waits until an address answers well, or everything has ended meanwhile. */
async function untilReady(address, hasEnded) {
  for (let waited = 0; waited < readyWithinMs; waited += lookAgainMs) {
    if (hasEnded()) return;
    const answer = await fetch(address).catch(() => undefined);
    if (answer?.ok === true) return;
    await pause(lookAgainMs);
  }
  throw new Unready(`${address} did not answer within ${readyWithinMs / 1000} s.`);
}

/** Collects what the application says between `--- people` and `--- end`. */
function createPeople() {
  const lines = [];
  let reading = false;
  return {
    lines,
    hear(line) {
      if (line === '--- people') {
        reading = true;
        lines.length = 0;
      } else if (line === '--- end') reading = false;
      else if (reading) lines.push(line);
    },
  };
}

function summary(stack, people) {
  const shown = path.relative(process.cwd(), stack.data) || '.';
  return [
    '',
    'Tierwell is running. Ctrl-C stops it.',
    '',
    `  Order a cake    ${stack.url}/`,
    `  Staff sign in   ${stack.url}/sign-in/staff`,
    ...people.map((line) => `    ${line}`),
    `  Mailbox         http://127.0.0.1:${stack.ports.mailbox}/   every e-mail ends here`,
    `  Google          http://127.0.0.1:${stack.ports.google}/   the stand-in's calls`,
    `  Data and logs   ${shown}`,
    '',
  ].join('\n');
}

/**
 * Starts everything and stays until a signal or the death of a part ends it all.
 * @param {object} options
 * @param {string} options.script the npm script, for what is said to the user
 * @param {boolean} options.splitPorts whether page and API listen apart, as while developing
 * @param {(stack: object) => object[]} options.parts the application's processes
 */
export async function runStack({ script, splitPorts, parts }) {
  const { api, ...ports } = portsFrom(process.env.PORT);
  const data = path.resolve(root, process.env.TIERWELL_DATA || defaultData);
  await requireFree(splitPorts ? { ...ports, api } : ports, script);
  await prepareData(data, process.argv.includes('--reset'));

  const url = `http://127.0.0.1:${ports.app}`;
  const google = `http://127.0.0.1:${ports.google}`;
  const secret = randomBytes(24).toString('base64url');
  const stack = {
    url,
    data,
    ports: { ...ports, api },
    env: {
      TIERWELL_DATA: data,
      PUBLIC_URL: url,
      SMTP_URL: `smtp://127.0.0.1:${ports.smtp}`,
      GOOGLE_AUTHORIZATION_URL: `${google}/o/oauth2/v2/auth`,
      GOOGLE_TOKEN_URL: `${google}/token`,
      GOOGLE_USERINFO_URL: `${google}/v3/userinfo`,
      GOOGLE_CLIENT_ID: 'tierwell-demo',
      GOOGLE_CLIENT_SECRET: secret,
    },
  };

  let ended = false;
  const children = createChildren(path.join(data, 'logs'), (message) => {
    if (ended) return;
    console.error(message);
    end(1);
  });

  async function end(code) {
    if (ended) return children.kill();
    ended = true;
    await children.stop();
    process.exit(code);
  }
  for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP']) process.on(signal, () => end(0));

  children.start({
    name: 'mailbox',
    args: ['--import', 'tsx', 'fakes/smtp/main.ts'],
    env: {
      MAILBOX_PORT: String(ports.mailbox),
      SMTP_PORT: String(ports.smtp),
      MAILBOX_DATA: path.join(data, 'mailbox'),
    },
  });
  children.start({
    name: 'google',
    args: ['--import', 'tsx', 'fakes/google/main.ts'],
    env: {
      GOOGLE_FAKE_PORT: String(ports.google),
      GOOGLE_FAKE_DATA: path.join(data, 'google'),
      GOOGLE_CLIENT_ID: stack.env.GOOGLE_CLIENT_ID,
      GOOGLE_CLIENT_SECRET: secret,
      GOOGLE_REDIRECT_URIS: `${url}/api/auth/google/callback`,
    },
  });

  const people = createPeople();
  const hasEnded = () => ended;
  try {
    // The app may send mail as soon as it is up, so what it talks to is up before it.
    await untilReady(`http://127.0.0.1:${ports.mailbox}/`, hasEnded);
    await untilReady(`${google}/`, hasEnded);
    for (const part of ended ? [] : parts(stack)) {
      children.start({
        ...part,
        onLine(line) {
          people.hear(line);
          part.onLine?.(line);
        },
      });
    }
    await untilReady(`${url}/api/ready`, hasEnded);
    if (!ended) console.log(summary(stack, people.lines));
  } catch (error) {
    console.error(error.message);
    await end(1);
  }
}

/** Runs a script to its end; what only needs reading is printed without a stack. */
export async function main(script) {
  try {
    await script();
  } catch (error) {
    console.error(error instanceof Unready ? error.message : error);
    process.exit(1);
  }
}
