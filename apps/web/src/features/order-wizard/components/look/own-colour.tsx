import { useId, useState } from 'react';
import { Button } from '#web/components/ui/button.tsx';

type Props = {
  readonly label: string;
  readonly onChoose: (colour: string) => void;
};

/** A colour of one's own, by the device's picker; it counts once it is taken. */
export function OwnColour({ label, onChoose }: Props) {
  const id = useId();
  const [colour, setColour] = useState('#d9767c');
  return (
    <div className="grid gap-1.5">
      <label htmlFor={id} className="font-semibold">
        {label}
      </label>
      <div className="flex gap-3">
        <input
          id={id}
          type="color"
          value={colour}
          className="h-11 w-20 cursor-pointer rounded-action border-[1.5px] border-slate bg-enamel p-1"
          onChange={(event) => setColour(event.target.value.toLowerCase())}
        />
        <Button kind="secondary" onClick={() => onChoose(colour)}>
          Take it
        </Button>
      </div>
    </div>
  );
}
