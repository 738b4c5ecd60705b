import { colourPicks } from '#shared/kitchen/colour.ts';
import { ChipChoices } from '#web/components/ui/chips.tsx';
import { Fold } from '#web/components/ui/fold.tsx';
import { colourName, photoColour } from '../../design/colour-name.ts';
import { useProblemAt } from '../../steps/use-answer.ts';
import { useWizard } from '../../wizard/wizard-context.ts';
import { ColourDot } from './colour-dot.tsx';
import { OwnColour } from './own-colour.tsx';

const mostColours = 5;

/** Up to five colours for what goes on the cake; those of the customer's photos are offered too. */
export function PaletteFields() {
  const { values, change, pictures } = useWizard();
  const { look } = values;
  const problem = useProblemAt('look.palette');
  const fromPhotos = Object.values(pictures).flatMap((it) => it.palette);
  const offered = [
    ...new Set([...fromPhotos, ...colourPicks.map((it) => it.colour), ...look.palette]),
  ];
  const full = look.palette.length >= mostColours;
  const put = (palette: string[]) => {
    if (palette.length <= mostColours) change({ look: { ...look, palette } });
  };
  return (
    <Fold label="Colors for what goes on it" open={look.palette.length > 0}>
      <div className="grid gap-4">
        <ChipChoices
          name="look.palette"
          legend="As many as five"
          optional
          hint={
            full
              ? 'That is five; take one out to choose another.'
              : 'For flowers, piping and ribbon; your photos’ colors come first.'
          }
          error={problem}
          chips={offered.map((colour) => ({
            value: colour,
            label: photoColour(colour, fromPhotos) ?? colourName(colour),
            picture: <ColourDot colour={colour} />,
          }))}
          value={look.palette}
          onValue={put}
        />
        <OwnColour
          label="Another color for it"
          onChoose={(colour) => {
            if (!look.palette.includes(colour)) put([...look.palette, colour]);
          }}
        />
      </div>
    </Fold>
  );
}
