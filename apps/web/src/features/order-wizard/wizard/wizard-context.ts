import { createContext, useContext } from 'react';
import type { Design } from '#shared/contracts/design.ts';
import type { Menu } from '#shared/contracts/menu.ts';
import type { LocalDate } from '#shared/dates/local-time.ts';
import type { OrderStep } from '#web/config/paths.ts';
import type { DraftKeeper } from '../draft/draft-keeper.ts';
import type { KeptPicture, SendAttempt } from '../draft/draft-record.ts';
import type { OrderForm } from '../draft/empty-order.ts';
import type { PhotoQueue } from '../photos/photo-queue.ts';
import type { RunningEstimate } from './use-estimate.ts';

/** What every part of the wizard works with. */
export type Wizard = {
  readonly menu: Menu;
  /** The studio's own today. */
  readonly today: LocalDate;
  /** The answers as they stand; a new object with every change. */
  readonly values: OrderForm;
  /** Null before there is a head count and an occasion. */
  readonly design: Design | null;
  readonly running: RunningEstimate;
  /** The furthest step that has been opened. */
  readonly reached: OrderStep;
  readonly reach: (step: OrderStep) => void;
  /** Changes whole sections; with `undo`, says so and offers to take it back. */
  readonly change: (sections: Partial<OrderForm>, undo?: string) => void;
  /** Puts all answers in place of the present ones. */
  readonly replace: (values: OrderForm) => void;
  readonly keeper: DraftKeeper;
  readonly queue: PhotoQueue;
  readonly pictures: Readonly<Record<string, KeptPicture>>;
  readonly attempt: SendAttempt | null;
  /** Notes a try at sending in the draft, at once; null once its end is known. */
  readonly noteAttempt: (attempt: SendAttempt | null) => void;
  /** Begins anew, with Undo. */
  readonly startOver: () => void;
  /** Shows what another page kept, or an empty form where it kept nothing. */
  readonly takeOther: () => void;
  /** Forgets the draft after the order was sent. */
  readonly finish: () => void;
};

export const WizardContext = createContext<Wizard | null>(null);

export function useWizard(): Wizard {
  const wizard = useContext(WizardContext);
  if (wizard === null) throw new Error('useWizard needs a WizardProvider above it.');
  return wizard;
}
