import type { Request, RequestHandler } from 'express';
import {
  ipKeyGenerator,
  rateLimit,
  type ClientRateLimitInfo,
  type Store,
} from 'express-rate-limit';
import type { Deps } from '#api/modules/deps.ts';
import { AppError } from '#api/platform/app-error.ts';
import type { Clock } from '#api/platform/clock.ts';

const minuteMs = 60_000;

/** How often one network, or one address written in a request, may do something. */
const limits = {
  /** Asking for a link by e-mail, from one place. */
  'request-link': { windowMs: 15 * minuteMs, limit: 30 },
  /** The same, to one e-mail address; nobody's mailbox is to be filled. */
  'request-link-to': { windowMs: 15 * minuteMs, limit: 5 },
  /** Using a link; keys have 128 bits, so this only keeps the noise down. */
  'spend-link': { windowMs: 15 * minuteMs, limit: 60 },
  'open-private-link': { windowMs: 15 * minuteMs, limit: 120 },
  google: { windowMs: 15 * minuteMs, limit: 60 },
  /** The calendar asks again at each choice; the answers are kept. */
  'answer-dates': { windowMs: minuteMs, limit: 120 },
  'submit-order': { windowMs: 60 * minuteMs, limit: 30 },
  'upload-photo': { windowMs: 60 * minuteMs, limit: 120 },
  /** A whole party may scan one care card from one network. */
  'see-cake-care': { windowMs: 15 * minuteMs, limit: 400 },
  /** Setting a page takes some work. */
  'print-card': { windowMs: 15 * minuteMs, limit: 60 },
  'write-message': { windowMs: 15 * minuteMs, limit: 60 },
} as const;
export type LimitName = keyof typeof limits;

/**
 * The network a request comes from: an IPv4 address, or the first 56 bits of an IPv6 one, which is
 * what one household or office is given.
 */
export function networkOf(request: Request): string {
  return ipKeyGenerator(request.ip ?? '', 56);
}

/** Refuses with `too-many-requests` what one network does too often. */
export function limitByAddress(deps: Pick<Deps, 'clock'>, name: LimitName): RequestHandler {
  return limitBy(deps, name, networkOf);
}

/** Refuses what is asked too often for one e-mail address, whoever asks. */
export function limitByEmail(deps: Pick<Deps, 'clock'>, name: LimitName): RequestHandler {
  return limitBy(deps, name, (request) => {
    const body: unknown = request.body;
    const named = typeof body === 'object' && body !== null && 'email' in body ? body.email : '';
    return typeof named === 'string' ? named.trim().toLowerCase().slice(0, 254) : '';
  });
}

function limitBy(
  { clock }: Pick<Deps, 'clock'>,
  name: LimitName,
  keyGenerator: (request: Request) => string,
): RequestHandler {
  const { windowMs, limit } = limits[name];
  return rateLimit({
    windowMs,
    limit,
    keyGenerator,
    store: new ClockStore(clock, windowMs),
    standardHeaders: false,
    legacyHeaders: false,
    validate: false,
    handler: (_request, _response, next) => {
      next(new AppError('too-many-requests', { retryAfterS: windowMs / 1000 }));
    },
  });
}

/** Counts in memory by the program's clock; what has run out is dropped as it is met. */
class ClockStore implements Store {
  readonly localKeys = true;
  readonly #clock: Clock;
  readonly #windowMs: number;
  readonly #counts = new Map<string, { hits: number; until: number }>();
  #sweepAt = 0;

  constructor(clock: Clock, windowMs: number) {
    this.#clock = clock;
    this.#windowMs = windowMs;
  }

  increment(key: string): ClientRateLimitInfo {
    const now = this.#clock.now().getTime();
    this.#sweep(now);
    const known = this.#counts.get(key);
    const count =
      known !== undefined && known.until > now ? known : { hits: 0, until: now + this.#windowMs };
    count.hits += 1;
    this.#counts.set(key, count);
    return { totalHits: count.hits, resetTime: new Date(count.until) };
  }

  decrement(key: string): void {
    const known = this.#counts.get(key);
    if (known !== undefined) known.hits = Math.max(0, known.hits - 1);
  }

  resetKey(key: string): void {
    this.#counts.delete(key);
  }

  #sweep(now: number): void {
    if (now < this.#sweepAt) return;
    this.#sweepAt = now + this.#windowMs;
    for (const [key, count] of this.#counts) if (count.until <= now) this.#counts.delete(key);
  }
}
