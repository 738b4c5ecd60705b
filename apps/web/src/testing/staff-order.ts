import type { Blocker, ConfirmationLook, StaffOrder } from '#shared/contracts/staff.ts';
import { evaluateDesign } from '#shared/kitchen/evaluate-design.ts';
import { designFixture } from '#shared/kitchen/testing/design-fixture.ts';
import { menuFixture } from '#shared/kitchen/testing/menu-fixture.ts';

/** Nothing may be done: tests say what may. */
export const nothingAllowed: StaffOrder['can'] = {
  confirm: false,
  decline: false,
  move: false,
  start: false,
  ready: false,
  collect: false,
  uncollected: false,
  write: false,
  answerAllergy: false,
  recordTalk: false,
  liftStop: false,
  renewLink: false,
  addPhotos: false,
  sendMailAgain: false,
  seeKitchen: false,
  seeCost: false,
  seePantry: false,
  acknowledgeContents: false,
  tellContents: false,
};

const pickup = {
  date: '2027-06-26',
  start: 660,
  minutes: 30,
  zone: 'America/New_York',
  startAt: '2027-06-26T15:00:00.000Z',
};

/** An order as the staff see it: Rosa Marchetti's wedding cake, asked for and with a place. */
export function staffOrderFixture(changes: Partial<StaffOrder> = {}): StaffOrder {
  const estimate = evaluateDesign(
    { design: designFixture, date: pickup.date },
    menuFixture,
    '2027-06-01',
  );
  return {
    number: 2431,
    code: 'k7m2p9',
    status: 'asked',
    rowVersion: 3,
    pickup,
    design: designFixture,
    estimate,
    agreedPrice: null,
    allergies: [],
    hold: null,
    fits: { fits: true, sentence: 'Has its place: 6 h 20 on Thursday and Friday.' },
    tasks: [],
    contacts: [
      {
        as: 'ordered',
        name: 'Rosa Marchetti',
        email: 'rosa@example.com',
        phone: '',
        reachBy: 'email',
      },
    ],
    unread: 0,
    messages: [],
    contentChanges: [],
    photos: [],
    events: [],
    mail: [],
    showPhotos: false,
    handover: null,
    blockers: [],
    lifted: [],
    can: nothingAllowed,
    ...changes,
  };
}

export const eggStop: Blocker = {
  code: 'allergen',
  level: 'stop',
  step: 'cake',
  about: 'allergen:egg',
  sentence: 'Egg is in the sponge and in the buttercream; one guest is allergic to it.',
  plain: 'Contains egg: sponge and buttercream. Declared: allergy, 1 guest.',
  instead: 'Talk with them first.',
  ways: [],
  talk: true,
  waitsFor: 'reason',
  talked: null,
};

/** The last look at that order. */
export function confirmationFixture(changes: Partial<ConfirmationLook> = {}): ConfirmationLook {
  const { rowVersion, estimate, fits } = staffOrderFixture();
  return {
    rowVersion,
    price: estimate.price,
    email: {
      to: 'rosa@example.com',
      subject: 'Order No. 2431 is confirmed',
      text: 'Your order is confirmed.',
      html: '<p>Your order is confirmed.</p>',
    },
    blockers: [],
    fits,
    ...changes,
  };
}
