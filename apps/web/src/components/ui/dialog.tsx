import type { ReactNode } from 'react';
import { Modal } from './modal.tsx';

type Props = {
  readonly open: boolean;
  readonly onClose: () => void;
  readonly title: ReactNode;
  readonly children: ReactNode;
};

/** A question in the middle of the screen; what cannot be undone is confirmed here in words. */
export function Dialog(props: Props) {
  return <Modal {...props} className="rim w-[calc(100%-2rem)] max-w-xl" />;
}
