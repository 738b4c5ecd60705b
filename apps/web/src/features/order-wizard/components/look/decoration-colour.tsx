import type { Coating } from '#shared/contracts/design.ts';
import { reachableTint } from '#shared/kitchen/colour.ts';
import { isDeepColour } from '#shared/kitchen/deep-colour.ts';
import { baseOf } from '../../design/as-it-comes-out.ts';
import { useWizard } from '../../wizard/wizard-context.ts';
import { ColourPair } from './colour-pair.tsx';
import { ReachMark } from './reach-mark.tsx';

type Props = {
  readonly colour: string;
  /** The buttercream it is piped in; null where it is made of something white. */
  readonly coating: Coating | null;
};

/** What a decoration's colour comes out as where it is piped, and that deep ones bleed. */
export function DecorationColour({ colour, coating }: Props) {
  const { menu } = useWizard();
  const piped = coating !== null && coating.style !== null;
  const base = piped ? baseOf({ ...coating, covering: 'buttercream' }, menu) : null;
  const deep = isDeepColour(colour);
  if (base === null && !deep) return null;
  const tint = base === null ? null : reachableTint(colour, base, menu.kitchen);
  return (
    <p className="flex flex-wrap items-center gap-x-3 gap-y-1 text-sm">
      {tint !== null && (
        <>
          <ColourPair wanted={colour} reached={tint.reached} />
          Piped in the cake’s own buttercream:
          <ReachMark reach={tint.reach} />
        </>
      )}
      {deep && <span>A deep color: it stains, and may bleed into pale ones.</span>}
    </p>
  );
}
