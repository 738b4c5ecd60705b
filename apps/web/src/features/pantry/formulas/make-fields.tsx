import type { Menu } from '#shared/contracts/menu.ts';
import type { Pantry } from '#shared/contracts/pantry.ts';
import { formatLength } from '#shared/kitchen/measures.ts';
import { ChipChoice } from '#web/components/ui/chips.tsx';
import { Select } from '#web/components/ui/select.tsx';
import { AmountField } from '../forms/amount-field.tsx';
import { gramsText } from '#web/lib/grams-text.ts';
import type { MakeAsked } from './make-amount.ts';

type Props = {
  readonly asked: MakeAsked;
  readonly fault: { readonly field: string | null; readonly message: string } | null;
  /** Whether tiers take this formula by themselves. */
  readonly forTiers: boolean;
  readonly menu: Menu;
  readonly pantry: Pantry;
  readonly onAsked: (patch: Partial<MakeAsked>) => void;
};

/** How much to make: as written, a weight, so many tiers, or so many bowls. */
export function MakeFields({ asked, fault, forTiers, menu, pantry, onAsked }: Props) {
  const error = (field: string) => (fault?.field === field ? fault.message : undefined);
  const { locale } = menu.studio;
  return (
    <div data-print="no" className="grid gap-4">
      <ChipChoice
        legend="How much to make"
        value={asked.by}
        onValue={(by) => onAsked({ by })}
        chips={[
          { value: 'written', label: 'As written' },
          { value: 'weight', label: 'A weight' },
          ...(forTiers ? [{ value: 'tiers' as const, label: 'For tiers' }] : []),
          ...(pantry.mixers.length > 0 ? [{ value: 'bowls' as const, label: 'Bowls' }] : []),
        ]}
      />
      {asked.by === 'weight' && (
        <AmountField
          label="Make"
          hint="What comes out of it: 1,850 g, 1.85 kg, 4 lb."
          name="make.weight"
          inputMode="text"
          value={asked.weight}
          error={error('weight')}
          onText={(weight) => onAsked({ weight })}
        />
      )}
      {asked.by === 'tiers' && (
        <TierFields asked={asked} error={error('tiers')} menu={menu} onAsked={onAsked} />
      )}
      {asked.by === 'bowls' && (
        <div className="flex flex-wrap items-end gap-3">
          <AmountField
            label="Bowls"
            name="make.bowls"
            className="max-w-20 tabular-nums"
            value={asked.bowls}
            error={error('bowls')}
            onText={(bowls) => onAsked({ bowls })}
          />
          <Select
            label="full, in the"
            name="make.mixer"
            value={asked.mixerId}
            onChange={(event) => onAsked({ mixerId: event.target.value })}
          >
            {pantry.mixers.map((it) => (
              <option key={it.id} value={it.id}>
                {it.name}, takes {gramsText(it.capacityG, locale)}
              </option>
            ))}
          </Select>
        </div>
      )}
    </div>
  );
}

type TierProps = Pick<Props, 'asked' | 'menu' | 'onAsked'> & { readonly error: string | undefined };

function TierFields({ asked, error, menu, onAsked }: TierProps) {
  const { lengthLead } = menu.studio;
  const size = menu.tierSizes[asked.size] ?? menu.tierSizes[0];
  return (
    <div className="flex flex-wrap items-end gap-3">
      <AmountField
        label="Tiers"
        name="make.tiers"
        className="max-w-20 tabular-nums"
        value={asked.tiers}
        error={error}
        onText={(tiers) => onAsked({ tiers })}
      />
      <Select
        label="of"
        name="make.size"
        value={asked.size}
        onChange={(event) => onAsked({ size: Number(event.target.value) })}
      >
        {menu.tierSizes.map((it, at) => (
          <option key={`${it.shape} ${it.widthMm} ${it.depthMm}`} value={at}>
            {it.shape === 'rectangle'
              ? `${formatLength(it.widthMm, lengthLead)} by ${formatLength(it.depthMm, lengthLead)}`
              : `${formatLength(it.widthMm, lengthLead)} ${it.shape}`}
          </option>
        ))}
      </Select>
      <Select
        label="high"
        name="make.height"
        value={asked.heightMm}
        onChange={(event) => onAsked({ heightMm: Number(event.target.value) })}
      >
        {(size?.heightsMm ?? []).map((it) => (
          <option key={it} value={it}>
            {formatLength(it, lengthLead)}
          </option>
        ))}
      </Select>
      <AmountField
        label="Layers of sponge"
        name="make.layers"
        className="max-w-20 tabular-nums"
        value={asked.layers}
        onText={(layers) => onAsked({ layers })}
      />
    </div>
  );
}
