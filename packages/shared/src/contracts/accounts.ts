import * as z from 'zod/mini';
import { emailAddress, id, instant, localDate, minor, requiredLine } from './common.ts';
import { orderStatus, role, staffRole } from './vocabulary.ts';

/** `GET /api/session`: who is there, and what the client must send back. */
export const sessionView = z.object({
  user: z.nullable(
    z.object({
      id,
      name: z.string(),
      email: z.string(),
      role,
      secondFactor: z.enum(['none', 'needed', 'done', 'to-enrol']),
    }),
  ),
  googleSignIn: z.boolean(),
});
export type SessionView = z.infer<typeof sessionView>;

/** `POST /api/session/links`: a one-time link by e-mail; always answered alike. */
export const requestSignInLink = z.object({
  email: emailAddress,
  next: z.optional(z.string().check(z.maxLength(300))),
});
export type RequestSignInLink = z.infer<typeof requestSignInLink>;

const linkToken = z.string().check(z.minLength(1), z.maxLength(100));

/** `POST /api/session/links/use`: spends the link; a button's press, since mail scanners open links. */
export const spendLink = z.object({ token: linkToken });
export type SpendLink = z.infer<typeof spendLink>;

/** What spending a link did: a sign-in says where to go on to, an action that it is done. */
export const spentLink = z.object({
  purpose: z.enum(['sign-in', 'confirm-action']),
  session: sessionView,
  next: z.nullable(z.string()),
});
export type SpentLink = z.infer<typeof spentLink>;

/** `POST /api/session/password`: staff. */
export const signInWithPassword = z.object({
  email: emailAddress,
  password: z.string().check(z.minLength(1, 'Write your password.'), z.maxLength(200)),
});
export type SignInWithPassword = z.infer<typeof signInWithPassword>;

/** NIST SP 800-63B-4: length, no composition rules, a blocklist (checked at the server). */
export const newPassword = z
  .string()
  .check(
    z.minLength(15, 'At least 15 characters; a few plain words do well.'),
    z.maxLength(200, 'At most 200 characters, please.'),
  );

/** `POST /api/session/password-resets`: asks for a link. */
export const requestPasswordReset = z.object({ email: emailAddress });
/** `POST /api/session/password-resets/use` */
export const resetPassword = z.object({
  token: z.string().check(z.maxLength(100)),
  password: newPassword,
});
export type ResetPassword = z.infer<typeof resetPassword>;

/** `POST /api/session/invitations/use`: staff invitation, or the first owner's link. */
export const acceptInvitation = z.object({
  token: z.string().check(z.maxLength(100)),
  name: requiredLine(120, 'Tell us your name.'),
  password: newPassword,
  /** Only with the first owner's link, which was sent to no address. */
  email: z.optional(emailAddress),
});
export type AcceptInvitation = z.infer<typeof acceptInvitation>;

/** `POST /api/session/links/look`: what a token is for, without spending it. */
export const lookAtLink = z.object({ token: linkToken });
export const linkLook = z.object({
  purpose: z.enum(['sign-in', 'invitation', 'password-reset', 'first-owner', 'confirm-action']),
  email: z.nullable(z.string()),
  role: z.nullable(role),
  /** With an invitation: whom the owner asked in, so that nobody is asked for it twice. */
  name: z.nullable(z.string()),
});

/** `POST /api/account/password`: staff, signed in; ends their other sessions. */
export const changePassword = z.object({
  password: z.string().check(z.minLength(1, 'Write your present password.'), z.maxLength(200)),
  newPassword,
});
export type ChangePassword = z.infer<typeof changePassword>;

/** `POST /api/session/second-factor`, and `.../removal` */
export const secondFactorCode = z.object({
  code: z
    .string()
    .check(z.trim(), z.minLength(6, 'Six figures, or a recovery code.'), z.maxLength(40)),
});
export type SecondFactorCode = z.infer<typeof secondFactorCode>;

/** `POST /api/session/second-factor/enrolment`: the secret to scan. */
export const secondFactorEnrolment = z.object({
  secret: z.string(),
  uri: z.string(),
  qrSvg: z.string(),
});
/** `POST /api/session/second-factor/enrolment/confirm` */
export const recoveryCodes = z.object({ codes: z.array(z.string()) });

/** `GET /api/account/sessions` */
export const ownSessions = z.object({
  sessions: z.array(
    z.object({
      id,
      current: z.boolean(),
      agent: z.string(),
      createdAt: instant,
      lastSeenAt: instant,
    }),
  ),
});
export type OwnSessions = z.infer<typeof ownSessions>;

/** `GET /api/account`: a customer's orders, newest first. */
export const accountView = z.object({
  name: z.string(),
  email: z.string(),
  google: z.boolean(),
  orders: z.array(
    z.object({
      code: z.string(),
      number: z.int(),
      status: orderStatus,
      date: localDate,
      summary: z.string(),
      totalMinor: minor,
      currency: z.string(),
    }),
  ),
});
export type AccountView = z.infer<typeof accountView>;

/** `GET /api/account/export`: everything kept about a person, to take away. */
export const accountExport = z.object({
  account: z.object({
    name: z.string(),
    email: z.string(),
    phone: z.nullable(z.string()),
    createdAt: instant,
    signsInWith: z.array(z.string()),
  }),
  consents: z.array(z.object({ kind: z.string(), given: z.boolean(), at: instant })),
  orders: z.array(
    z.object({
      number: z.int(),
      code: z.string(),
      status: orderStatus,
      createdAt: instant,
      pickupDate: z.nullable(localDate),
      contacts: z.array(
        z.object({
          as: z.string(),
          name: z.string(),
          email: z.nullable(z.string()),
          phone: z.nullable(z.string()),
        }),
      ),
      allergies: z.array(
        z.object({
          allergen: z.nullable(z.string()),
          text: z.string(),
          severity: z.string(),
          guests: z.int(),
          answer: z.nullable(z.string()),
        }),
      ),
      words: z.array(z.string()),
      notes: z.array(z.string()),
      totalMinor: minor,
      currency: z.string(),
      messages: z.array(
        z.object({ from: z.string(), author: z.string(), body: z.string(), at: instant }),
      ),
      photos: z.array(z.object({ id, kind: z.string(), note: z.string(), at: instant })),
      mail: z.array(
        z.object({ to: z.string(), subject: z.string(), text: z.string(), at: instant }),
      ),
    }),
  ),
});
export type AccountExport = z.infer<typeof accountExport>;

/** `POST /api/account/erasure`: asks for the confirming e-mail; spent through `links/use`. */
export const eraseAccount = z.object({ sure: z.literal(true) });

/** `GET /api/staff/people` */
export const staffPerson = z.object({
  id,
  name: z.string(),
  email: z.string(),
  role: staffRole,
  state: z.enum(['active', 'invited', 'ended']),
  secondFactor: z.boolean(),
  lastSeenAt: z.nullable(instant),
  can: z.object({ end: z.boolean(), invite: z.boolean(), changeRole: z.boolean() }),
});
export const staffPeople = z.object({
  people: z.array(staffPerson),
  requireSecondFactor: z.boolean(),
  can: z.object({ invite: z.boolean() }),
});
export type StaffPeople = z.infer<typeof staffPeople>;

/** `POST /api/staff/people/invitations` */
export const inviteStaff = z.object({
  email: emailAddress,
  name: requiredLine(120, 'Tell us the name.'),
  role: staffRole,
});
export type InviteStaff = z.infer<typeof inviteStaff>;

/** `PUT /api/staff/people/:id/role`; the person signs in again with it. */
export const changeRole = z.object({ role: staffRole });
export type ChangeRole = z.infer<typeof changeRole>;
