import type { Coating } from '#shared/contracts/design.ts';
import { colourPicks, nearerBases, reachableTint, type Reach } from '#shared/kitchen/colour.ts';
import { formatList } from '#shared/dates/format.ts';
import { ChipChoice } from '#web/components/ui/chips.tsx';
import { baseOf } from '../../design/as-it-comes-out.ts';
import { colourName, photoColour } from '../../design/colour-name.ts';
import { useWizard } from '../../wizard/wizard-context.ts';
import { ColourDot } from './colour-dot.tsx';
import { OwnColour } from './own-colour.tsx';

const plain = 'plain';

const reachWords: Readonly<Record<Reach, string>> = {
  close: '',
  shifts: ', shifts',
  'not-on-this-base': ', not on this',
};

/** The colour of the coat: each shown as it comes out on the base, which has a colour of its own. */
export function CoatColourFields({ coating }: { readonly coating: Coating }) {
  const { menu, values, change, pictures } = useWizard();
  const base = baseOf(coating, menu);
  const fromPhotos = Object.values(pictures).flatMap((it) => it.palette);
  const wanted = [
    ...new Set([
      ...colourPicks
        .filter((it) => reachableTint(it.colour, base).reach !== 'not-on-this-base')
        .map((it) => it.colour),
      ...fromPhotos,
      ...(coating.colour === null ? [] : [coating.colour]),
    ]),
  ];
  const put = (colour: string | null) =>
    change({ cake: { ...values.cake, coating: { ...coating, colour } } });

  return (
    <div className="grid gap-4">
      <ChipChoice
        name="cake.coating.colour"
        legend="Colour of the coat"
        hint="As each comes out on the coat you chose, which has a colour of its own."
        chips={[
          { value: plain, label: 'As it is', picture: <ColourDot colour={base} /> },
          ...wanted.map((colour) => {
            const tint = reachableTint(colour, base);
            return {
              value: colour,
              label: `${photoColour(colour, fromPhotos) ?? colourName(colour)}${reachWords[tint.reach]}`,
              picture: <ColourDot colour={tint.reached} />,
            };
          }),
        ]}
        value={coating.colour ?? plain}
        onValue={(value) => put(value === plain ? null : value)}
      />
      <ComesOut coating={coating} base={base} />
      <OwnColour label="Another colour for the coat" onChoose={put} />
    </div>
  );
}

/** How far the wished-for colour shifts on this base, and on which it would come nearer. */
function ComesOut({ coating, base }: { readonly coating: Coating; readonly base: string }) {
  const { menu } = useWizard();
  if (coating.colour === null) return null;
  const { reach, reached } = reachableTint(coating.colour, base);
  if (reach === 'close') return <p role="status">It comes out close to what you chose.</p>;
  const nearer = nearerBases(coating.colour, base, menu.styles).slice(0, 3);
  return (
    <div role="status" className="grid gap-2 rounded-action bg-butter-tint px-4 py-3">
      <p className="flex flex-wrap items-center gap-x-4 gap-y-1 font-semibold">
        {reach === 'shifts' ? 'It shifts on this base:' : 'This colour does not come on this base:'}
        <span className="inline-flex items-center gap-2 font-normal">
          <ColourDot colour={coating.colour} /> you chose
        </span>
        <span className="inline-flex items-center gap-2 font-normal">
          <ColourDot colour={reached} /> it comes out
        </span>
      </p>
      {nearer.length > 0 && <p>It comes nearer on {formatList(nearer.map((it) => it.name))}.</p>}
    </div>
  );
}
