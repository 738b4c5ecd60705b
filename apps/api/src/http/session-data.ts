import 'express-session';
import type { OrderGrant } from '#api/platform/private-link.ts';

declare module 'express-session' {
  /** What a session keeps, beside its cookie. */
  interface SessionData {
    /** Who signed in; absent for a browser that only holds private links. */
    userId?: string;
    /** Staff have shorter limits. */
    staff?: boolean;
    /** Of staff: until it is `done` (or `none` is asked for) there are no rights. */
    secondFactor?: SecondFactorState;
    /** Orders whose private link this browser has opened; good until the link is renewed. */
    orders?: OrderGrant[];
    /** What the browser says it is, for the list of one's own sessions. */
    agent?: string;
    address?: string;
    /** Where to go after a sign-in elsewhere, and what it is for. */
    google?: { purpose: 'sign-in' | 'link'; next: string };
    /** Written by the store when it reads: last use, in milliseconds since 1970. */
    seenAt?: number;
  }
}

export type SecondFactorState = 'none' | 'needed' | 'to-enrol' | 'done';
