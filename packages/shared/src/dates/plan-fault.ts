import type { Shift, Work } from './model.ts';

/** A rule of the model that a plan breaks. */
export type Fault = {
  readonly rule:
    | 'missing-work'
    | 'unknown-work'
    | 'outside-shift'
    | 'in-the-past'
    | 'after-pickup'
    | 'gap'
    | 'shelf-life'
    | 'too-early'
    | 'capacity'
    | 'one-order-a-shift'
    | 'hands'
    | 'allergen'
    | 'cold'
    | 'window'
    | 'cap'
    | 'kept-back'
    | 'closed'
    | 'book-not-open'
    | 'notice';
  readonly orderId: string;
  readonly sentence: string;
};

/** Says what an order breaks. */
export type MakeFault = (rule: Fault['rule'], sentence: string) => Fault;

/** A piece of work where the plan has put it; no shift where there is none of that name. */
export type Placed = {
  readonly orderId: string;
  readonly work: Work;
  readonly shift: Shift | undefined;
  readonly start: number;
  readonly end: number;
};
