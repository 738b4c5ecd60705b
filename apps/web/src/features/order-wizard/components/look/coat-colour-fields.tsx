import type { Coating } from '#shared/contracts/design.ts';
import { colourPicks, reachableTint, type Reach } from '#shared/kitchen/colour.ts';
import { ChipChoice } from '#web/components/ui/chips.tsx';
import { baseOf } from '../../design/as-it-comes-out.ts';
import { colourName, photoColour } from '../../design/colour-name.ts';
import { useWizard } from '../../wizard/wizard-context.ts';
import { ColourDot } from './colour-dot.tsx';
import { ColourPair } from './colour-pair.tsx';
import { OnEachCoat } from './on-each-coat.tsx';
import { OwnColour } from './own-colour.tsx';
import { reachWords } from './reach-words.ts';

const plain = 'plain';
const nearness: readonly Reach[] = ['close', 'shifts', 'not-on-this-base'];

type Props = {
  /** The coat the colour is for. */
  readonly coating: Coating;
  /** Its place in the form. */
  readonly name: string;
  readonly legend: string;
  readonly ownLabel: string;
  readonly onCoating: (coating: Coating, undo?: string) => void;
};

/**
 * The colour of a coat: each shown as it was picked and as it comes out, since the coat has a colour
 * of its own; those that come nearest first.
 */
export function CoatColourFields({ coating, name, legend, ownLabel, onCoating }: Props) {
  const { menu, pictures } = useWizard();
  const base = baseOf(coating, menu);
  const fromPhotos = Object.values(pictures).flatMap((it) => it.palette);
  const nameOf = (colour: string) => photoColour(colour, fromPhotos) ?? colourName(colour);
  const wanted = [
    ...new Set([
      ...fromPhotos,
      ...colourPicks.map((it) => it.colour),
      ...(coating.colour === null ? [] : [coating.colour]),
    ]),
  ]
    .map((colour) => reachableTint(colour, base, menu.kitchen))
    .toSorted((a, b) => nearness.indexOf(a.reach) - nearness.indexOf(b.reach));
  const { colour } = coating;

  return (
    <div className="grid gap-4">
      <ChipChoice
        name={name}
        legend={legend}
        hint="Left as you see it here, right as it comes out on the coat, which has a color of its own."
        chips={[
          { value: plain, label: 'As it is', picture: <ColourDot colour={base} /> },
          ...wanted.map((tint) => ({
            value: tint.wanted,
            label:
              tint.reach === 'close'
                ? nameOf(tint.wanted)
                : `${nameOf(tint.wanted)}, ${reachWords[tint.reach]}`,
            picture: <ColourPair wanted={tint.wanted} reached={tint.reached} />,
          })),
        ]}
        value={colour ?? plain}
        onValue={(value) => onCoating({ ...coating, colour: value === plain ? null : value })}
      />
      {colour !== null && (
        <OnEachCoat coating={{ ...coating, colour }} name={nameOf(colour)} onCoat={onCoating} />
      )}
      <OwnColour
        label={ownLabel}
        base={base}
        onChoose={(chosen) => onCoating({ ...coating, colour: chosen })}
      />
    </div>
  );
}
