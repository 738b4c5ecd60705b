import type { ComponentProps, ReactNode } from 'react';
import { classNames } from '#web/lib/class-names.ts';
import { Spinner } from './spinner.tsx';

export type ButtonKind = 'primary' | 'secondary' | 'quiet' | 'danger';
export type ButtonSize = 'normal' | 'bench';

const kinds: Record<ButtonKind, string> = {
  primary: 'border-cobalt bg-cobalt text-enamel hover:border-ink hover:bg-ink',
  secondary: 'border-cobalt bg-enamel text-cobalt hover:bg-cobalt-tint',
  quiet: 'border-transparent bg-transparent px-2 text-cobalt hover:bg-cobalt-tint',
  danger: 'border-berry bg-enamel text-berry hover:bg-berry-tint',
};

/** The look of an action, for buttons and for links that act like one. */
export function actionClasses(kind: ButtonKind, size: ButtonSize, wide: boolean): string {
  return classNames(
    'inline-flex items-center justify-center gap-2 rounded-action border-[1.5px] text-center font-semibold no-underline select-none',
    size === 'bench' ? 'min-h-14 px-6 text-lg' : 'min-h-11 px-5 py-2',
    kinds[kind],
    wide && 'w-full',
  );
}

type Props = Omit<ComponentProps<'button'>, 'disabled'> & {
  readonly kind?: ButtonKind;
  readonly size?: ButtonSize;
  readonly wide?: boolean;
  /** Under way: presses are ignored, focus stays, progress shows. */
  readonly pending?: boolean;
  readonly children: ReactNode;
};

/** An action. Always live: it says what is missing when pressed instead of being greyed out. */
export function Button({
  kind = 'primary',
  size = 'normal',
  wide = false,
  pending = false,
  type = 'button',
  className,
  onClick,
  children,
  ...rest
}: Props) {
  return (
    <button
      {...rest}
      type={type}
      aria-disabled={pending || undefined}
      className={classNames(actionClasses(kind, size, wide), className)}
      onClick={(event) => {
        if (pending) event.preventDefault();
        else onClick?.(event);
      }}
    >
      {pending && <Spinner />}
      {children}
    </button>
  );
}
