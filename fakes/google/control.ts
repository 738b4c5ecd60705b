import * as z from 'zod/mini';
import { read, tell } from '#fakes/harness/control-request.ts';
import type { GoogleCall, GoogleClient, GoogleFailure } from './wire.ts';
import { googleCall } from './wire.ts';

export interface GoogleControl {
  /** Lets the next `times` sign-ins fail in this way (1 unless said). */
  failNext(failure: GoogleFailure, times?: number): Promise<void>;
  clearFailures(): Promise<void>;
  /** Every request so far, or since the given instant. */
  calls(since?: Date): Promise<GoogleCall[]>;
  /** Registers an application, or replaces the one of the same id. */
  register(client: GoogleClient): Promise<void>;
}

/** The control client of a running stand-in, for tests; `url` as its `start` gave it. */
export function googleControl(url: string): GoogleControl {
  return {
    failNext: (failure, times = 1) => tell(`${url}/api/failures`, 'POST', { failure, times }),
    clearFailures: () => tell(`${url}/api/failures`, 'DELETE'),
    calls: (since) => {
      const query = since === undefined ? '' : `?since=${since.toISOString()}`;
      return read(`${url}/api/calls${query}`, z.array(googleCall));
    },
    register: (client) => tell(`${url}/api/clients`, 'PUT', client),
  };
}
