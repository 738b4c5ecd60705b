import { useId, useState } from 'react';
import { reachableTint } from '#shared/kitchen/colour.ts';
import { Button } from '#web/components/ui/button.tsx';
import { TextField } from '#web/components/ui/text-field.tsx';
import { useWizard } from '../../wizard/wizard-context.ts';
import { readColour } from '../../design/read-colour.ts';
import { ColourDot } from './colour-dot.tsx';
import { ReachMark } from './reach-mark.tsx';

type Props = {
  readonly label: string;
  readonly onChoose: (colour: string) => void;
  /** The coat it is for: what it would come out as shows while it is looked for. */
  readonly base?: string;
};

/** A colour of one's own, by the device's picker or by its figures; it counts once it is taken. */
export function OwnColour({ label, onChoose, base }: Props) {
  const { menu } = useWizard();
  const id = useId();
  const [typed, setTyped] = useState('#d9767c');
  const [tried, setTried] = useState(false);
  const colour = readColour(typed);
  const tint =
    colour === null || base === undefined ? null : reachableTint(colour, base, menu.kitchen);
  return (
    <div className="grid gap-2" role="group" aria-label={label}>
      <div className="flex flex-wrap items-end gap-3">
        <TextField
          label={label}
          error={
            tried && colour === null
              ? 'Write a color as # and six figures, like #bcd7ea.'
              : undefined
          }
          className="max-w-36 tabular-nums"
          autoComplete="off"
          spellCheck={false}
          maxLength={12}
          value={typed}
          onChange={(event) => setTyped(event.target.value)}
        />
        <span className="grid">
          <label htmlFor={id} className="sr-only">
            {label}, from a picker
          </label>
          <input
            id={id}
            type="color"
            value={colour ?? '#ffffff'}
            className="h-11 w-14 cursor-pointer rounded-action border-[1.5px] border-slate bg-enamel p-1"
            onChange={(event) => setTyped(event.target.value.toLowerCase())}
          />
        </span>
        <Button
          kind="secondary"
          onClick={() => {
            setTried(true);
            if (colour !== null) onChoose(colour);
          }}
        >
          Take it
        </Button>
      </div>
      {tint !== null && (
        <p className="flex flex-wrap items-center gap-x-3 gap-y-1 text-sm text-slate">
          <ColourDot colour={tint.reached} /> as it would come out
          <ReachMark reach={tint.reach} />
        </p>
      )}
    </div>
  );
}
