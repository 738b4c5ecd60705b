import { TextField } from '#web/components/ui/text-field.tsx';
import { Button } from '#web/components/ui/button.tsx';
import { usualSpans, type Span } from '../search/span.ts';

type Props = {
  readonly span: Span;
  readonly today: string;
  readonly onSpan: (span: Span) => void;
};

/** Which days are meant: typed, or one of the usual stretches in a press. */
export function SpanFields({ span, today, onSpan }: Props) {
  return (
    <div className="flex flex-wrap items-end gap-x-5 gap-y-3">
      <TextField
        type="date"
        label="Made from"
        value={span.from}
        onChange={({ target: { value } }) => {
          if (value !== '') onSpan({ from: value, to: value > span.to ? value : span.to });
        }}
      />
      <TextField
        type="date"
        label="to"
        value={span.to}
        min={span.from}
        onChange={({ target: { value } }) => {
          if (value !== '') onSpan({ from: value < span.from ? value : span.from, to: value });
        }}
      />
      <div className="flex flex-wrap gap-2">
        {usualSpans(today).map((it) => (
          <Button key={it.name} kind="quiet" onClick={() => onSpan(it.span)}>
            {it.name}
          </Button>
        ))}
      </div>
    </div>
  );
}
