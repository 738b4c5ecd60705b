import { everydayForms } from './demo-everyday-forms.ts';
import { demoForms } from './demo-forms.ts';
import type { DemoForm } from './demo-parts.ts';
import type { drawings } from './demo-pictures.ts';

/** An order that was taken; days count from today. */
export type Promised = {
  readonly form: DemoForm;
  readonly sent: number;
  /** The first day that is open from the one to the other. */
  readonly from: number;
  readonly to: number;
  readonly prefer: 'first' | 'last';
  readonly window: number;
  /** Further than its pickup asks for, so that there is one to look at on any day. */
  readonly already?: 'making' | 'ready';
  readonly pictures?: readonly (keyof typeof drawings)[];
  /** Taken of it when it was done and when it was handed over. */
  readonly picture?: keyof typeof drawings;
};

const taken = (
  form: DemoForm,
  sent: number,
  from: number,
  more: Partial<Promised> = {},
): Promised => ({ form, sent, from, to: from + 6, prefer: 'first', window: 0, ...more });

/** What is in the demo's book: a week that is over, and three that are well filled. */
export const demoBook: readonly Promised[] = [
  taken(everydayForms.kemp, -19, -9),
  taken(everydayForms.abara, -19, -8, { window: 2 }),
  taken(everydayForms.halloran, -18, -7),
  taken(everydayForms.lindqvist, -18, -6, { window: 1 }),
  taken(everydayForms.okafor, -17, -5, { window: 4 }),
  taken(demoForms.firstBirthday, -13, -6, {
    to: -1,
    prefer: 'last',
    pictures: ['rose'],
    picture: 'rose',
  }),
  taken(everydayForms.brandt, -16, -3),
  taken(everydayForms.moreau, -19, -2, { window: 3 }),
  taken(everydayForms.tanaka, -14, 0, { window: 5 }),
  taken(demoForms.carrot, -18, 1, { to: 5, already: 'ready', picture: 'rose' }),
  taken(demoForms.retirement, -9, 1, { already: 'making' }),
  taken(everydayForms.novak, -12, 2, { window: 2 }),
  taken(demoForms.graduation, -8, 3, { to: 12 }),
  taken(everydayForms.delgado, -13, 3, { window: 4 }),
  taken(everydayForms.haddow, -18, 4, { window: 1 }),
  taken(everydayForms.rossi, -10, 5),
  taken(demoForms.anniversary, -7, 6, { to: 16, pictures: ['meadow'] }),
  taken(everydayForms.castro, -9, 7, { window: 1 }),
  taken(everydayForms.whelan, -6, 8, { window: 3 }),
  taken(everydayForms.yilmaz, -8, 9),
  taken(demoForms.wedding, -15, 10, { to: 24, pictures: ['barley', 'meadow'] }),
  taken(everydayForms.pereira, -4, 11, { window: 2 }),
  taken(everydayForms.osborne, -5, 13),
  taken(everydayForms.fairweather, -3, 14, { window: 5 }),
  taken(everydayForms.sandoval, -11, 16, { window: 1 }),
  taken(everydayForms.ahmadi, -3, 18),
  taken(everydayForms.grier, -2, 20, { window: 3 }),
];
