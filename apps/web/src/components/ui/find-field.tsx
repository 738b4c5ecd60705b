import { useEffect, useState } from 'react';
import { TextField } from './text-field.tsx';

type Props = {
  readonly hint: string;
  /** What is looked for now, as the address says it. */
  readonly find: string;
  readonly onFind: (find: string) => void;
};

/** Typing rests this long before the address follows. */
const restMs = 300;

/** Finds by words; the address follows once typing rests, or at once when the field is left. */
export function FindField({ hint, find, onFind }: Props) {
  const [text, setText] = useState(find);
  const [seen, setSeen] = useState({ find, sent: find });
  if (find !== seen.find) {
    setSeen({ find, sent: find });
    // Came by a link: what we sent ourselves must not overwrite what is typed since.
    if (find !== seen.sent) setText(find);
  }
  const wanted = text.trim();
  const waiting = wanted !== find && wanted !== seen.sent;
  useEffect(() => {
    if (!waiting) return undefined;
    const timer = setTimeout(() => {
      setSeen((now) => ({ ...now, sent: wanted }));
      onFind(wanted);
    }, restMs);
    return () => clearTimeout(timer);
  }, [waiting, wanted, onFind]);
  return (
    <div className="min-w-0 grow basis-64">
      <TextField
        type="search"
        label="Find"
        hint={hint}
        autoComplete="off"
        maxLength={100}
        value={text}
        onChange={(event) => setText(event.target.value)}
        // A link pressed next must not be overtaken by the address that was still to follow.
        onBlur={() => {
          if (!waiting) return;
          setSeen((now) => ({ ...now, sent: wanted }));
          onFind(wanted);
        }}
      />
    </div>
  );
}
