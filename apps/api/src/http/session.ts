import { promisify } from 'node:util';
import type { Request, RequestHandler } from 'express';
import session from 'express-session';
import type { Deps } from '#api/modules/deps.ts';
import { grantOf } from '#api/platform/private-link.ts';
import type { LinkedOrder } from '#api/platform/private-link.ts';
import { forgetActor } from './authenticate.ts';
import type { SecondFactorState } from './session-data.ts';
import { sessionLimits, SessionStore } from './session-store.ts';

/**
 * The session of a request. The cookie only says which row it is; both limits are kept by the row
 * and the program's clock, the cookie's age only lets browsers forget it.
 */
export function sessions({ env, clock }: Pick<Deps, 'env' | 'clock'>): RequestHandler {
  const middleware = session({
    name: env.secureCookies ? '__Host-tierwell' : 'tierwell',
    secret: env.sessionSecret,
    store: new SessionStore(clock),
    resave: false,
    saveUninitialized: false,
    rolling: false,
    proxy: true,
    cookie: {
      httpOnly: true,
      sameSite: 'lax',
      secure: env.secureCookies,
      path: '/',
      maxAge: sessionLimits.customer.absoluteMs,
    },
  });
  return (request, response, next) => {
    // Where the public address is https, people come through a proxy that ends TLS, and not every
    // one says so; without this word the cookie (which is Secure all the same) would be held back.
    if (env.secureCookies) request.headers['x-forwarded-proto'] ??= 'https';
    middleware(request, response, next);
  };
}

/** Whoever has just proven who they are. */
export type SignedIn = {
  readonly userId: string;
  readonly staff: boolean;
  readonly secondFactor: SecondFactorState;
};

/**
 * Starts a session under a new name (what was known of the old one before signing in opens
 * nothing any more). Private links a customer opened as a guest are carried over; staff have none.
 */
export async function startSession(request: Request, who: SignedIn): Promise<void> {
  const { orders = [] } = request.session;
  await renew(request);
  request.session.userId = who.userId;
  request.session.staff = who.staff;
  request.session.secondFactor = who.secondFactor;
  if (!who.staff && orders.length > 0) request.session.orders = orders;
  await saveSession(request);
}

/** Of more private links than anybody holds, the latest count. */
const mostOrders = 200;

/** Adds an order this browser may see; the session is renewed since its rights grow. */
export async function grantOrder(request: Request, order: LinkedOrder): Promise<void> {
  const { userId, staff, secondFactor, orders = [] } = request.session;
  const grant = grantOf(order);
  const others = orders.filter(({ id }) => id !== grant.id);
  const had = orders.find(({ id }) => id === grant.id);
  if (had !== undefined && had.renewedAt === grant.renewedAt) return;
  await renew(request);
  request.session.userId = userId;
  request.session.staff = staff;
  request.session.secondFactor = secondFactor;
  request.session.orders = [...others, grant].slice(-mostOrders);
  await saveSession(request);
}

/** Ends this session; the next request is a visitor's. */
export async function endSession(request: Request): Promise<void> {
  await renew(request);
}

/** Writes the session before the answer leaves, so that the next request finds it. */
export async function saveSession(request: Request): Promise<void> {
  request.session.agent = (request.get('User-Agent') ?? '').slice(0, 300);
  request.session.address = request.ip ?? '';
  await promisify(request.session.save.bind(request.session))();
  forgetActor(request);
}

async function renew(request: Request): Promise<void> {
  await promisify(request.session.regenerate.bind(request.session))();
  forgetActor(request);
}
