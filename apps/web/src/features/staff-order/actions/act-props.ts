import type { Menu } from '#shared/contracts/menu.ts';
import type { StaffOrder } from '#shared/contracts/staff.ts';

/** What every act's dialog works with. */
export type ActProps = {
  readonly order: StaffOrder;
  readonly menu: Menu;
  /** It went through. */
  readonly onDone: () => void;
  readonly onClose: () => void;
};
