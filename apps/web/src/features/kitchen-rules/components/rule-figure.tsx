import { memo } from 'react';
import { usualKitchen, type KitchenRules } from '#shared/contracts/kitchen-rules.ts';
import type { StudioCard } from '#shared/contracts/menu.ts';
import type { RuleField } from '../draft/rule-groups.ts';
import { FigureField } from './figure-field.tsx';

type Props = {
  readonly field: RuleField;
  readonly value: number;
  readonly studio: StudioCard;
  readonly error: string | undefined;
  /** The same function each time, so that typing in one field draws that one alone. */
  readonly onRule: (name: keyof KitchenRules, value: number) => void;
};

/** One figure of the kitchen. */
export const RuleFigure = memo(function RuleFigure(props: Props) {
  const { field, value, studio, error, onRule } = props;
  const { name, label, kind, unit } = field;
  return (
    <FigureField
      name={`rules.${name}`}
      label={label}
      kind={kind}
      unit={unit}
      value={value}
      usual={usualKitchen[name]}
      studio={studio}
      error={error}
      onValue={(it) => onRule(name, it)}
    />
  );
});
