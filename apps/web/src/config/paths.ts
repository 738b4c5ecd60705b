import type { PolicyText } from '#shared/contracts/menu.ts';

/** The order's six steps, in their order; each is an address of its own. */
export const orderSteps = ['day', 'cake', 'setting', 'look', 'you', 'check'] as const;
export type OrderStep = (typeof orderSteps)[number];

/** What a one-time link out of an e-mail is for; each opens a page of its own. */
export const linkPurposes = [
  'sign-in',
  'invitation',
  'password-reset',
  'first-owner',
  'confirm',
] as const;
export type LinkPurpose = (typeof linkPurposes)[number];

/** How much the calendar shows at once. */
export const calendarViews = ['day', 'week', 'month'] as const;
export type CalendarViewName = (typeof calendarViews)[number];

/** Every address of the web app. `pattern` strings are for the router, functions for links. */
export const paths = {
  home: '/',
  menu: '/menu',
  care: '/care',
  policies: '/policies',
  policy: (kind: PolicyText['kind']) => `/policies#${kind}`,
  order: '/order',
  /** The order begun with a cake; after the `#`, so that no server reads of an allergy in it. */
  orderWith: (start: Readonly<Record<string, string>>) =>
    `/order#${new URLSearchParams(start).toString()}`,
  orderStep: (step: OrderStep) => `/order/${step}`,
  orderSent: '/order/sent',
  myOrder: (code: string) => `/orders/${encodeURIComponent(code)}`,
  /** The page about one cake, by the code on its care card. */
  cakeCare: (code: string) => `/cake/${encodeURIComponent(code)}`,
  account: '/account',
  signIn: '/sign-in',
  signInThen: (next: string) => `/sign-in?next=${encodeURIComponent(next)}`,
  staffSignIn: '/sign-in/staff',
  secondFactor: '/sign-in/second-factor',
  forgottenPassword: '/sign-in/forgotten-password',
  link: (purpose: LinkPurpose) => `/links/${purpose}`,
  staff: '/staff',
  staffOrders: '/staff/orders',
  staffOrder: (number: number) => `/staff/orders/${number}`,
  staffKitchenSheet: (number: number) => `/staff/orders/${number}/kitchen`,
  staffCalendar: '/staff/calendar',
  staffCalendarAt: (view: CalendarViewName, date: string) =>
    `/staff/calendar?view=${view}&date=${date}`,
  staffPeople: '/staff/studio',
  staffPrices: '/staff/studio/prices',
  staffPantry: '/staff/pantry',
  staffFormulas: '/staff/pantry/formulas',
  staffFormula: (id: string) => `/staff/pantry/formulas/${encodeURIComponent(id)}`,
  staffFormulaEdit: (id: string) => `/staff/pantry/formulas/${encodeURIComponent(id)}/edit`,
  staffFormulaNew: '/staff/pantry/formulas/new',
  staffFormulaCopy: (versionId: string) =>
    `/staff/pantry/formulas/new?from=${encodeURIComponent(versionId)}`,
  staffIngredients: '/staff/pantry/ingredients',
  staffIngredient: (id: string) => `/staff/pantry/ingredients/${encodeURIComponent(id)}`,
  staffIngredientNew: '/staff/pantry/ingredients/new',
  staffEggs: '/staff/pantry/eggs',
  staffShopping: '/staff/pantry/shopping',
  staffKitchen: '/staff/studio/kitchen',
  staffAllergies: '/staff/studio/allergies',
  staffMe: '/staff/me',
  staffMail: (id: string) => `/staff/mail/${encodeURIComponent(id)}`,
} as const;

/** A place of ours to go on to, from an untrusted `next` parameter; never another site. */
export function safeNext(next: string | null, otherwise: string): string {
  return next !== null && /^\/(?![/\\])/.test(next) ? next : otherwise;
}
