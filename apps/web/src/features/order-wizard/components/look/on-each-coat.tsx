import { useRef } from 'react';
import type { Coating } from '#shared/contracts/design.ts';
import { coatBases, tryOnCoats, type TriedColour } from '#shared/kitchen/coat-bases.ts';
import { isDeepColour } from '#shared/kitchen/deep-colour.ts';
import { coatingName } from '#shared/kitchen/resolve-design.ts';
import { CoatSwatch } from '#web/components/coats/coat-swatch.tsx';
import { Button } from '#web/components/ui/button.tsx';
import { Fold } from '#web/components/ui/fold.tsx';
import { ToneGlyph } from '#web/components/ui/notice.tsx';
import { VisuallyHidden } from '#web/components/ui/visually-hidden.tsx';
import { reachableTint } from '#shared/kitchen/colour.ts';
import { coatOf } from '../../design/choose-coat.ts';
import { baseOf } from '../../design/as-it-comes-out.ts';
import { useWizard } from '../../wizard/wizard-context.ts';
import { ColourDot } from './colour-dot.tsx';
import { ReachMark } from './reach-mark.tsx';

type Props = {
  readonly coating: Coating & { readonly colour: string };
  /** The colour's name, or its figures. */
  readonly name: string;
  /** Puts another coat in this one's place; the colour stays. */
  readonly onCoat: (coating: Coating, undo: string) => void;
};

/** What a chosen colour comes out as: on the coat it is for, and on each other one. */
export function OnEachCoat({ coating, name, onCoat }: Props) {
  const { menu, running } = useWizard();
  const panel = useRef<HTMLDivElement>(null);
  const { colour } = coating;
  const bases = coatBases(menu, coating.style);
  const isOurs = ({ base }: TriedColour) =>
    base.covering === coating.covering && base.style === coating.style;
  const tried = tryOnCoats(colour, bases, menu);
  const here = reachableTint(colour, baseOf(coating, menu), menu.kitchen);
  const others = tried.filter((it) => !isOurs(it));
  const nearer = others.filter(
    ({ tint }) => tint.difference < here.difference && tint.reach !== 'not-on-this-base',
  );
  const covering = menu.coverings.find((it) => it.id === coating.covering);
  const style = menu.styles.find((it) => it.id === coating.style) ?? null;
  const coat = covering === undefined ? 'your coat' : coatingName({ covering, style });

  const row = (it: TriedColour) => {
    const { base, tint } = it;
    const rank = running.estimate?.ranks.find(
      ({ covering: id, style: of }) => id === base.covering && of === base.style,
    );
    return (
      <li
        key={base.id}
        className="grid grid-cols-[4.5rem_minmax(0,1fr)] items-center gap-x-4 gap-y-1 py-3 sm:grid-cols-[4.5rem_minmax(0,1fr)_auto]"
      >
        <CoatSwatch
          menu={menu}
          covering={base.covering}
          style={base.style}
          colour={tint.reached}
          className="w-18"
        />
        <div className="grid gap-0.5">
          <p className="flex flex-wrap items-baseline gap-x-3">
            <strong className="font-display">{base.name}</strong>
            <ReachMark reach={tint.reach} />
          </p>
          {rank !== undefined && rank.level !== 'ok' && (
            <p className="text-sm text-slate">
              {rank.level === 'stop' ? 'Not for your day: ' : 'With care: '}
              {rank.sentence}
            </p>
          )}
        </div>
        {nearer.includes(it) && (
          <Button
            kind="secondary"
            className="col-start-2 justify-self-start sm:col-start-3"
            onClick={() => {
              onCoat(
                coatOf({ covering: base.covering, style: base.style }, coating, menu),
                `${base.name} it is.`,
              );
              // The button goes with the coat it offered; the focus stays with the color.
              panel.current?.focus({ preventScroll: true });
            }}
          >
            Change to it<VisuallyHidden>: {base.name}</VisuallyHidden>
          </Button>
        )}
      </li>
    );
  };

  return (
    <div ref={panel} tabIndex={-1} className="grid gap-3 border-l-2 border-cobalt pl-4">
      <div role="status" className="grid gap-3">
        <p className="flex flex-wrap items-center gap-x-3 gap-y-1">
          <strong className="font-display">
            {name} on {coat}
          </strong>
          <ReachMark reach={here.reach} />
        </p>
        <div className="flex flex-wrap gap-x-6 gap-y-2 text-sm text-slate">
          <span className="inline-flex items-center gap-2">
            <ColourDot colour={colour} large /> as you chose it
          </span>
          <span className="inline-flex items-center gap-2">
            <ColourDot colour={here.reached} large /> as it comes out
          </span>
        </div>
        <p>{outcome(here.reach, nearer.length > 0)}</p>
        {isDeepColour(colour) && (
          <p className="flex gap-2 text-sm">
            <ToneGlyph tone="butter" />
            Deep colors stain lips, fingers and cloth, and may bleed into a pale color beside them.
          </p>
        )}
      </div>
      {nearer.length > 0 && <ul className="grid divide-y divide-seam">{nearer.map(row)}</ul>}
      <Fold label="On each of our coats">
        <ul className="grid divide-y divide-seam">
          {others.filter((it) => !nearer.includes(it)).map(row)}
        </ul>
      </Fold>
    </div>
  );
}

function outcome(reach: TriedColour['tint']['reach'], elsewhere: boolean): string {
  if (reach === 'close') return 'It comes out close to what you chose.';
  const base = 'The coat has a color of its own, and coloring only adds to it.';
  if (reach === 'shifts') {
    return `${base} It keeps its name, but shifts.${elsewhere ? ' It comes nearer on:' : ''}`;
  }
  return `${base} This color cannot be made on it.${elsewhere ? ' It comes nearer on:' : ' None of our coats comes near enough.'}`;
}
