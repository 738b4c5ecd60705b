import type { StudioCard } from '#shared/contracts/menu.ts';
import { Button } from '#web/components/ui/button.tsx';
import { NumberField } from '#web/components/ui/number-field.tsx';
import { readFigure, tellFigure, writeFigure, type FigureKind } from '../draft/figure-kinds.ts';

type Props = {
  /** Its place in the settings, for its problem and the summary's link. */
  readonly name: string;
  readonly label: string;
  readonly kind: FigureKind;
  readonly unit?: string | undefined;
  /** Where nothing is usual. */
  readonly hint?: string | undefined;
  readonly value: number;
  /** What studios go by that set nothing; null where there is no such figure. */
  readonly usual: number | null;
  readonly studio: StudioCard;
  readonly error: string | undefined;
  readonly onValue: (value: number) => void;
};

/** One figure, with what is usual and the way back to it. */
export function FigureField(props: Props) {
  const { name, label, kind, unit, hint, value, usual, studio, error, onValue } = props;
  const told = usual === null ? null : tellFigure(kind, usual, studio, unit);
  return (
    <div className="grid content-start gap-1">
      <NumberField
        name={name}
        label={label}
        hint={told === null ? hint : `Usually ${told}`}
        error={error}
        inputMode={kind === 'number' ? 'decimal' : 'text'}
        className="max-w-32 tabular-nums"
        {...(unit === undefined ? {} : { unit })}
        read={(text) => readFigure(kind, text, studio)}
        write={(it) => writeFigure(kind, it, studio)}
        value={value}
        onValue={(typed) => onValue(typed ?? Number.NaN)}
      />
      {usual !== null && !Object.is(value, usual) && (
        <div className="-ml-2">
          <Button
            kind="quiet"
            aria-label={`${label}: back to the usual ${told ?? ''}`}
            onClick={() => onValue(usual)}
          >
            Back to the usual
          </Button>
        </div>
      )}
    </div>
  );
}
