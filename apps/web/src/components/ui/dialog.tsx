import type { ReactNode } from 'react';
import { classNames } from '#web/lib/class-names.ts';
import { Modal } from './modal.tsx';

type Props = {
  readonly open: boolean;
  readonly onClose: () => void;
  readonly title: ReactNode;
  /** For things to read side by side. */
  readonly wide?: boolean;
  readonly children: ReactNode;
};

/** A question in the middle of the screen; what cannot be undone is confirmed here in words. */
export function Dialog({ wide = false, ...props }: Props) {
  return (
    <Modal
      {...props}
      className={classNames('rim w-[calc(100%-2rem)]', wide ? 'max-w-5xl' : 'max-w-xl')}
    />
  );
}
