import type { ReactNode } from 'react';
import { Modal } from './modal.tsx';

type Props = {
  readonly open: boolean;
  readonly onClose: () => void;
  readonly title: ReactNode;
  readonly children: ReactNode;
};

/** A sheet from the bottom edge of a phone. */
export function Drawer(props: Props) {
  return (
    <Modal
      {...props}
      className="mx-0 mb-0 max-h-[88dvh] w-full max-w-none rounded-t-rim border-2 border-b-0 border-cobalt"
    />
  );
}
