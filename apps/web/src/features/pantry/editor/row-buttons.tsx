import { VisuallyHidden } from '#web/components/ui/visually-hidden.tsx';

type Props = {
  /** "line 3": who hears the buttons hears which one they move. */
  readonly what: string;
  readonly onUp: () => void;
  readonly onDown: () => void;
  readonly onRemove: () => void;
};

/** Up, down and away, for a row of a list. */
export function RowButtons({ what, onUp, onDown, onRemove }: Props) {
  return (
    <span className="flex shrink-0">
      <RowButton label={`Move ${what} up`} path="M3 9.5L8 4.5l5 5" onPress={onUp} />
      <RowButton label={`Move ${what} down`} path="M3 6.5l5 5 5-5" onPress={onDown} />
      <RowButton label={`Take ${what} away`} path="M4 4l8 8M12 4l-8 8" onPress={onRemove} />
    </span>
  );
}

type ButtonProps = {
  readonly label: string;
  readonly path: string;
  readonly onPress: () => void;
};

function RowButton({ label, path, onPress }: ButtonProps) {
  return (
    <button
      type="button"
      onClick={onPress}
      className="grid h-11 w-9 place-items-center rounded-action text-cobalt hover:bg-cobalt-tint"
    >
      <svg viewBox="0 0 16 16" className="size-4" aria-hidden="true">
        <path
          d={path}
          fill="none"
          stroke="currentColor"
          strokeWidth="1.8"
          strokeLinecap="round"
          strokeLinejoin="round"
        />
      </svg>
      <VisuallyHidden>{label}</VisuallyHidden>
    </button>
  );
}
