import { createHash } from 'node:crypto';
import session, { type SessionData } from 'express-session';
import { Op } from 'sequelize';
import * as z from 'zod/mini';
import { Session } from '#api/db/models/session.ts';
import { inTransaction } from '#api/db/transaction.ts';
import type { Clock } from '#api/platform/clock.ts';

const minute = 60_000;
const hour = 60 * minute;
const dayMs = 24 * hour;

type Limits = { readonly idleMs: number; readonly absoluteMs: number };

/**
 * How long a session lasts unused, and at most. Staff: a working day unused at the counter is the
 * longest gap, and a day overall (NIST SP 800-63B-4, section 2.2.3: 24 hours at AAL2).
 */
export const sessionLimits = {
  /** A browser on its way through another service's sign-in. */
  passing: { idleMs: hour, absoluteMs: hour },
  /** A password was right, the second factor is still to come. */
  halfway: { idleMs: 10 * minute, absoluteMs: 10 * minute },
  staff: { idleMs: 8 * hour, absoluteMs: dayMs },
  customer: { idleMs: 30 * dayMs, absoluteMs: 90 * dayMs },
} as const satisfies Record<string, Limits>;

/** A use is noted at most this often, so that reading a page does not write a row. */
const touchEveryMs = 5 * minute;

export function limitsOf(data: SessionData): Limits {
  if (data.userId === undefined) {
    return data.orders === undefined ? sessionLimits.passing : sessionLimits.customer;
  }
  if (data.secondFactor === 'needed') return sessionLimits.halfway;
  return data.staff === true ? sessionLimits.staff : sessionLimits.customer;
}

/** Rows are named by a hash, so that a copy of the database opens nobody's session. */
export function sessionRowId(sid: string): string {
  return createHash('sha256').update(sid).digest('base64url');
}

const storedData = z.looseObject({
  cookie: z.looseObject({ expires: z.nullish(z.string()), originalMaxAge: z.nullish(z.number()) }),
});

type Done<T = void> = (error: unknown, result?: T) => void;

/**
 * Sessions in the database by the clock of the program. A row past its idle or absolute limit is
 * refused and removed when it is asked for; a session that was ended elsewhere stays ended even
 * when a slow request of its own would save it again.
 */
export class SessionStore extends session.Store {
  readonly #clock: Clock;

  constructor(clock: Clock) {
    super();
    this.#clock = clock;
  }

  override get(sid: string, done: Done<SessionData | null>): void {
    settle(this.#load(sid), done);
  }

  override set(sid: string, data: SessionData, done: Done = ignore): void {
    settle(this.#save(sid, data), done);
  }

  override destroy(sid: string, done: Done = ignore): void {
    settle(this.#remove(sid), done);
  }

  override touch(sid: string, data: SessionData, done: Done = ignore): void {
    const due = this.#clock.now().getTime() - (data.seenAt ?? 0) >= touchEveryMs;
    settle(due ? this.#touch(sid, data) : Promise.resolve(), done);
  }

  async #load(sid: string): Promise<SessionData | null> {
    const row = await Session.findByPk(sessionRowId(sid));
    if (row === null) return null;
    const now = this.#clock.now();
    if (row.expires <= now || row.absoluteExpiresAt <= now) {
      await this.#remove(sid);
      return null;
    }
    return readData(row.data, row.lastSeenAt.getTime());
  }

  async #save(sid: string, data: SessionData): Promise<void> {
    const now = this.#clock.now();
    const limits = limitsOf(data);
    const { seenAt, ...kept } = data;
    const fields = {
      userId: data.userId ?? null,
      data: JSON.stringify(kept),
      lastSeenAt: now,
      address: data.address ?? null,
      agent: data.agent ?? '',
    };
    await inTransaction(async () => {
      const row = await Session.findByPk(sessionRowId(sid));
      if (row !== null) {
        const absolute = new Date(row.createdAt.getTime() + limits.absoluteMs);
        await row.update({
          ...fields,
          absoluteExpiresAt: absolute,
          expires: earlier(new Date(now.getTime() + limits.idleMs), absolute),
        });
        return;
      }
      // It was read from a row that is gone: ended meanwhile. Writing it would bring it back.
      if (seenAt !== undefined) return;
      await Session.create({
        ...fields,
        sid: sessionRowId(sid),
        createdAt: now,
        absoluteExpiresAt: new Date(now.getTime() + limits.absoluteMs),
        expires: new Date(now.getTime() + limits.idleMs),
      });
    });
  }

  async #touch(sid: string, data: SessionData): Promise<void> {
    const now = this.#clock.now();
    const expires = new Date(now.getTime() + limitsOf(data).idleMs);
    await inTransaction(() =>
      Session.update(
        { lastSeenAt: now, expires },
        { where: { sid: sessionRowId(sid), expires: { [Op.gt]: now } } },
      ),
    );
  }

  async #remove(sid: string): Promise<void> {
    await inTransaction(() => Session.destroy({ where: { sid: sessionRowId(sid) } }));
  }
}

/** What a row holds; one that cannot be read counts as none. */
function readData(text: string, seenAt: number): SessionData | null {
  const parsed = z.safeParse(storedData, JSON.parse(text));
  if (!parsed.success) return null;
  const { cookie: kept, ...rest } = parsed.data;
  const cookie = Object.assign(new session.Cookie(), kept, {
    expires: typeof kept.expires === 'string' ? new Date(kept.expires) : null,
  });
  return { ...rest, seenAt, cookie };
}

function earlier(one: Date, other: Date): Date {
  return one < other ? one : other;
}

function ignore(): void {}

/** Express-session speaks callbacks; a throw inside one must not be taken for a failed promise. */
function settle<T>(work: Promise<T>, done: Done<T>): void {
  work.then(
    (result) => setImmediate(done, null, result),
    (error: unknown) => setImmediate(done, error),
  );
}
