import type { StudioCard } from '#shared/contracts/menu.ts';
import { FigureField } from './figure-field.tsx';

type Props = {
  /** °C, January first. */
  readonly figures: readonly number[];
  readonly studio: StudioCard;
  readonly errorAt: (name: string) => string | undefined;
  readonly onFigures: (figures: number[]) => void;
};

/** The warmest hour of each month, as the studio has noted it. */
export function MonthFields({ figures, studio, errorAt, onFigures }: Props) {
  const names = new Intl.DateTimeFormat(studio.locale, { month: 'long', timeZone: 'UTC' });
  return (
    <div className="grid grid-cols-2 gap-x-6 gap-y-4 sm:grid-cols-4 lg:grid-cols-6">
      {figures.map((value, month) => {
        const name = `monthlyWarmestC.${month}`;
        return (
          <FigureField
            key={name}
            name={name}
            label={names.format(new Date(Date.UTC(2026, month, 15)))}
            kind="warmth"
            value={value}
            usual={null}
            studio={studio}
            error={errorAt(name)}
            onValue={(it) => onFigures(figures.map((old, at) => (at === month ? it : old)))}
          />
        );
      })}
    </div>
  );
}
