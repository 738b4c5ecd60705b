import { mkdtemp, rm, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import path from 'node:path';
import autocannon from 'autocannon';
import { guardHeader } from '#shared/contracts/headers.ts';
import { demoStaff } from '#api/modules/demo/demo-people.ts';
import { orderForm, roundTier } from '#api/testing/order-form.ts';
import { startBeside, startProgram } from './program.ts';
import { atLeast, median, type Part } from './report.ts';

const rounds = 5;
const secondsEach = 4;
const connections = 16;

type Load = {
  readonly path: string;
  readonly headers: Record<string, string>;
  /** Sent one after the other; none for a GET. */
  readonly bodies: readonly string[];
};

/** As many requests a second as the other side answers, all of them well. */
async function requestsPerSecond(url: string, { path: route, headers, bodies }: Load) {
  const result = await autocannon({
    url: url + route,
    connections,
    duration: secondsEach,
    headers,
    ...(bodies.length > 0 && {
      requests: bodies.map((body) => ({ method: 'POST' as const, path: route, body })),
    }),
  });
  if (result.non2xx + result.errors + result.timeouts > 0) {
    throw new Error(`${route}: ${result.non2xx} not 2xx, ${result.errors} errors`);
  }
  return result.requests.mean;
}

/** A member of the demo's staff, signed in: the cookie of their browser. */
async function signIn(url: string): Promise<string> {
  const [person] = demoStaff;
  const answer = await fetch(`${url}/api/session/password`, {
    method: 'POST',
    headers: { 'Content-Type': 'application/json', Origin: url, [guardHeader]: '1' },
    body: JSON.stringify({ email: person?.email, password: person?.password }),
  });
  const [cookie] = answer.headers.getSetCookie();
  if (!answer.ok || cookie === undefined) throw new Error(`not signed in: ${await answer.text()}`);
  return cookie.split(';')[0] ?? '';
}

/**
 * Our route's requests a second against a bare route's that sends the same bytes, measured in
 * turns so that both meet the same weather; the median of the turns' ratios.
 */
async function ratioToBare(
  note: (line: string) => void,
  loadFor: (url: string) => Load,
): Promise<number> {
  const program = await startProgram();
  const folder = await mkdtemp(path.join(tmpdir(), 'tierwell-bench-'));
  try {
    const plain = loadFor(program.url);
    const load = {
      ...plain,
      headers: { ...plain.headers, Cookie: await signIn(program.url) },
    };
    const [body] = load.bodies;
    const answer = await fetch(program.url + load.path, {
      headers: load.headers,
      ...(body === undefined ? {} : { method: 'POST', body }),
    });
    const file = path.join(folder, 'body');
    await writeFile(file, Buffer.from(await answer.arrayBuffer()));
    const bare = await startBeside('bare-route.process.ts', [file]);
    try {
      const ratios: number[] = [];
      for (let round = 0; round < rounds; round += 1) {
        const theirs = await requestsPerSecond(bare.url, { ...load, path: '/' });
        const ours = await requestsPerSecond(program.url, load);
        note(`${ours.toFixed(0)} a second, bare ${theirs.toFixed(0)}`);
        ratios.push(ours / theirs);
      }
      return median(ratios);
    } finally {
      await bare.stop();
    }
  } finally {
    await program.stop();
    await rm(folder, { recursive: true, force: true });
  }
}

export const menu: Part = {
  name: 'menu',
  about: 'GET /api/menu, signed in and logging, against a bare Express route with the same body',
  async run(note) {
    const ratio = await ratioToBare(note, () => ({ path: '/api/menu', headers: {}, bodies: [] }));
    return [atLeast('/api/menu to a bare route', 0.7, ratio)];
  },
};

/** Designs as customers go through them, for these numbers of guests. */
function designsFor(headCounts: readonly number[]): string[] {
  const styles = ['american', 'swiss', 'italian', 'french', 'german', 'russian'];
  return headCounts.flatMap((headCount) =>
    styles.map((style) => {
      const { day, cake, setting, look, extras } = orderForm('2027-06-19');
      const { date, windowStart, ...guests } = { ...day, headCount };
      const tiers = headCount > 40 ? [roundTier(10), roundTier(8), roundTier(6)] : [roundTier(8)];
      const coating = { ...cake.coating, style };
      return JSON.stringify({
        design: { guests, cake: { ...cake, tiers, coating }, setting, look, extras },
        date,
      });
    }),
  );
}

const estimateLoad =
  (bodies: readonly string[]) =>
  (url: string): Load => ({
    path: '/api/estimates',
    headers: { 'Content-Type': 'application/json', Origin: url, [guardHeader]: '1' },
    bodies,
  });

export const estimates: Part = {
  name: 'estimates',
  about: 'POST /api/estimates of 36 designs in turn, against a bare route that sends an estimate',
  async run(note) {
    const again = await ratioToBare(note, estimateLoad(designsFor([12, 20, 32, 48, 70, 100])));
    // More of them than are remembered, so that each is worked out.
    const headCounts = Array.from({ length: 120 }, (_, n) => 10 + n);
    note('designs that are each another:');
    const anew = await ratioToBare(note, estimateLoad(designsFor(headCounts)));
    note(`each worked out anew: ${anew.toFixed(2)} of a bare route`);
    return [atLeast('/api/estimates to a bare route', 0.3, again)];
  },
};
