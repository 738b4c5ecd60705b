import type { PlacedDecoration } from '#shared/contracts/design.ts';
import { decorationSource } from '#shared/contracts/vocabulary.ts';
import { tierName } from '#shared/kitchen/tier-name.ts';
import { DecorationGlyph } from '#web/components/cake-drawing/decoration-glyph.tsx';
import { Button } from '#web/components/ui/button.tsx';
import { NumberField } from '#web/components/ui/number-field.tsx';
import { ToneGlyph } from '#web/components/ui/notice.tsx';
import { Select } from '#web/components/ui/select.tsx';
import { colourGroups } from '../../design/colour-groups.ts';
import { colourName, photoColour } from '../../design/colour-name.ts';
import { useProblemAt } from '../../steps/use-answer.ts';
import { useWizard } from '../../wizard/wizard-context.ts';
import { DecorationColour } from './decoration-colour.tsx';
import { sourceWords } from './source-words.ts';

const whole = 'whole';

type Props = {
  readonly at: number;
  readonly placed: PlacedDecoration;
  readonly onChange: (placed: PlacedDecoration) => void;
  readonly onRemove: () => void;
};

/** One decoration on the cake: where, how many, in which colour, and who brings it. */
export function DecorationRow({ at, placed, onChange, onRemove }: Props) {
  const { menu, values, pictures } = useWizard();
  const path = `look.decorations.${at}`;
  const quantityProblem = useProblemAt(`${path}.quantity`);
  const onMenu = menu.decorations.find((it) => it.id === placed.decorationId);
  if (onMenu === undefined) return null;
  const { tiers, kind } = values.cake;
  const fromPhotos = Object.values(pictures).flatMap((it) => it.palette);
  const groups = colourGroups(values.look.palette, fromPhotos, placed.colour);
  const coating =
    (placed.tier === null ? null : tiers[placed.tier]?.coating) ?? values.cake.coating;
  return (
    <li className="grid gap-3 border-l-2 border-cobalt pl-4">
      <div className="flex items-center justify-between gap-4">
        <h3 className="flex items-center gap-3">
          <DecorationGlyph glyph={onMenu.glyph} colour={placed.colour} />
          {onMenu.name}
        </h3>
        <Button kind="quiet" aria-label={`Take ${onMenu.name} off`} onClick={onRemove}>
          Take off
        </Button>
      </div>
      {onMenu.caution !== '' && (
        <p className="flex gap-2 text-sm">
          <ToneGlyph tone="butter" />
          {onMenu.caution}
        </p>
      )}
      <div className="grid gap-4 min-[480px]:grid-cols-2 sm:grid-cols-4">
        {kind === 'tiered' && tiers.length > 1 && (
          <Select
            name={`${path}.tier`}
            label="Where"
            value={placed.tier ?? whole}
            onChange={(event) =>
              onChange({
                ...placed,
                tier: event.target.value === whole ? null : Number(event.target.value),
              })
            }
          >
            <option value={whole}>The whole cake</option>
            {tiers
              .map((_, tier) => (
                <option key={tier} value={tier}>
                  {tierName(tier, tiers.length)}
                </option>
              ))
              .toReversed()}
          </Select>
        )}
        <NumberField
          name={`${path}.quantity`}
          label="How many"
          error={quantityProblem}
          value={placed.quantity}
          onValue={(value) => onChange({ ...placed, quantity: value ?? Number.NaN })}
        />
        <Select
          name={`${path}.colour`}
          label="Color"
          value={placed.colour ?? ''}
          onChange={(event) => onChange({ ...placed, colour: event.target.value || null })}
        >
          <option value="">As we think best</option>
          {groups.map(({ label, colours }) => (
            <optgroup key={label} label={label}>
              {colours.map((it) => (
                <option key={it} value={it}>
                  {photoColour(it, fromPhotos) ?? colourName(it)}
                </option>
              ))}
            </optgroup>
          ))}
        </Select>
        {onMenu.sources.length > 1 && (
          <Select
            name={`${path}.source`}
            label="From"
            value={placed.source}
            onChange={(event) => {
              const source = decorationSource.safeParse(event.target.value);
              if (source.success) onChange({ ...placed, source: source.data });
            }}
          >
            {onMenu.sources.map((it) => (
              <option key={it} value={it}>
                {sourceWords[it]}
              </option>
            ))}
          </Select>
        )}
      </div>
      {placed.colour !== null && (
        <DecorationColour
          colour={placed.colour}
          // A piped border is the cake's own buttercream; sugar, paper and ribbon start white.
          coating={onMenu.glyph === 'border' ? coating : null}
        />
      )}
    </li>
  );
}
