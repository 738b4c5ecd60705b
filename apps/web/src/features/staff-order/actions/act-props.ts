import type { ReactNode } from 'react';
import type { Menu } from '#shared/contracts/menu.ts';
import type { StaffOrder } from '#shared/contracts/staff.ts';

/** What every act's dialog works with. */
export type ActProps = {
  readonly order: StaffOrder;
  readonly menu: Menu;
  /** What the price leaves, for the owner; beside it where it is about to be confirmed. */
  readonly margin?: ReactNode;
  /** It went through. */
  readonly onDone: () => void;
  readonly onClose: () => void;
};
