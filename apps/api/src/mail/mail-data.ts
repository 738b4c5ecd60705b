import type { LocalDate } from '#shared/dates/local-time.ts';
import type { StaffRole } from '#shared/contracts/vocabulary.ts';
import type { ChosenRow } from '#shared/kitchen/chosen-words.ts';
import type { DrawnTier } from './content.ts';

export type MailPickup = {
  readonly date: LocalDate;
  readonly start: number;
  readonly minutes: number;
};

/** An order as a mail tells of it. */
export type MailOrder = {
  readonly number: number;
  /** The private link in a customer's mail, the staff's page of the order in a mail to staff. */
  readonly link: string;
  /** Who ordered. */
  readonly name: string;
  /** Who collects, where that is somebody else. */
  readonly collector: string | null;
  /** Null while it has no day. */
  readonly pickup: MailPickup | null;
  readonly occasion: string;
  readonly headCount: number;
  /** The cake in a line: "Three tiers, 10, 8 and 5 in, 71 portions". */
  readonly summary: string;
  /** What was chosen, for reading over: inside, coat, words, what is put on. */
  readonly chosen: readonly ChosenRow[];
  readonly tiers: readonly DrawnTier[];
  readonly price: MailPrice;
  /** In the words of the studio's region, worked out from the ingredients. */
  readonly contains: readonly string[];
  readonly mayContain: readonly string[];
  readonly handled: readonly string[];
  readonly keepCool: string;
  /** What comes out of the cake or off it before it is eaten, in sentences. */
  readonly beforeEating: readonly string[];
  readonly weightG: number;
  readonly heightMm: number;
};

export type MailPrice = {
  readonly currency: string;
  readonly lines: readonly { readonly label: string; readonly amountMinor: number }[];
  readonly totalMinor: number;
};

/** An order that contains something else now, as the studio is told of it. */
type ChangedOrder = {
  readonly number: number;
  /** The staff's page of the order. */
  readonly link: string;
  readonly pickup: MailPickup | null;
  readonly changes: readonly string[];
  /** It is against something guests told; what that is stands on the order's page. */
  readonly clashes: boolean;
};

type Hold = { readonly expiresAt: Date; readonly needsLink: boolean };
type OfOrder = { readonly order: MailOrder };
type Written = { readonly by: string; readonly body: string };
type OfLink = { readonly link: string; readonly expiresAt: Date };

/**
 * Every mail there is, and what it is made from. What guests cannot eat is health data and in none
 * of them: mails say that something was told and lead to the order's page.
 */
export type MailData = {
  'order-received': OfOrder & {
    /** The place that is kept; null where there is none. */
    readonly hold: Hold | null;
    /** The date could not be promised when it was asked for. */
    readonly dateOpen: boolean;
    /** What has to be settled first, about the table and the cake; and what to mind. */
    readonly stops: readonly string[];
    readonly cares: readonly string[];
    /** The studio's answer time. */
    readonly answerHours: number;
  };
  confirmed: OfOrder & { readonly note: string };
  declined: OfOrder & { readonly reason: string; readonly nearest: readonly LocalDate[] };
  withdrawn: OfOrder;
  moved: OfOrder & {
    readonly from: MailPickup | null;
    readonly note: string;
    /** A calendar file comes with it. */
    readonly calendar: boolean;
  };
  'hold-ran-out': OfOrder;
  'warmth-asked': OfOrder;
  'stop-lifted': OfOrder;
  'private-link-renewed': OfOrder;
  /** What is in the cake now, in sentences about the cake alone. */
  'ingredient-changed': OfOrder & { readonly changes: readonly string[] };
  message: OfOrder & Written;
  ready: OfOrder & { readonly openings: readonly string[] };
  'thank-you': OfOrder;
  'sign-in-link': OfLink;
  'action-to-confirm': OfLink & { readonly name: string; readonly action: 'erase-account' };

  'new-order': OfOrder & {
    readonly hold: Hold | null;
    readonly dateOpen: boolean;
    readonly stops: readonly string[];
    readonly cares: readonly string[];
    /** Something about who will eat is to be read on the order's page. */
    readonly aboutGuests: 'allergy' | 'advice' | null;
  };
  'withdrawn-notice': OfOrder & { readonly reason: string };
  'hold-ran-out-notice': OfOrder;
  'customer-message': OfOrder & Written;
  'ingredient-changed-notice': {
    /** What was changed: "The label of Dark chocolate buttons". */
    readonly cause: string;
    readonly by: string;
    readonly orders: readonly ChangedOrder[];
  };
  'staff-invitation': OfLink & {
    readonly name: string;
    readonly role: StaffRole;
    readonly invitedBy: string | null;
  };
  'password-reset': OfLink & { readonly name: string };
  'sign-in-link-refused': { readonly name: string; readonly link: string };
  'mail-given-up': {
    readonly subject: string;
    readonly to: string;
    /** What the mail server said. */
    readonly reason: string;
    readonly orderNumber: number | null;
    /** The staff's page of the mail, where it can be read and sent again. */
    readonly link: string;
  };
};

export type MailTemplate = keyof MailData;
