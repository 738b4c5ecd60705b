import { useEffect, useState } from 'react';
import { TextField } from '#web/components/ui/text-field.tsx';

type Props = {
  readonly hint: string;
  readonly find: string;
  readonly onFind: (find: string) => void;
};

/** Typing rests this long before the address follows. */
const restMs = 200;

/** Finds by words; the address follows once typing rests. */
export function FindField({ hint, find, onFind }: Props) {
  const [text, setText] = useState(find);
  const [seen, setSeen] = useState({ find, sent: find });
  if (find !== seen.find) {
    setSeen({ ...seen, find });
    // Came by a link: what we sent ourselves must not overwrite what is typed since.
    if (find !== seen.sent) setText(find);
  }
  useEffect(() => {
    const wanted = text.trim();
    if (wanted === find) return undefined;
    const timer = setTimeout(() => {
      setSeen((now) => ({ ...now, sent: wanted }));
      onFind(wanted);
    }, restMs);
    return () => clearTimeout(timer);
  }, [text, find, onFind]);
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
      />
    </div>
  );
}
