import type { Dispatch } from 'react';
import { ToneGlyph } from '#web/components/ui/notice.tsx';
import type { EditorAction } from './editor-actions.ts';
import type { LineRow } from './editor-form.ts';
import { type RowReading, settledText } from './read-row.ts';

type Props = {
  readonly row: LineRow;
  readonly reading: RowReading;
  readonly dispatch: Dispatch<EditorAction>;
};

/** What the proofreader has to say of a line, with one press for either figure, and its choices. */
export function LineRemark({ row, reading, dispatch }: Props) {
  const write = (text: string) =>
    dispatch({ type: 'text', key: row.key, text, words: reading.words });
  const choices = reading.part === null ? reading.candidates : [];
  return (
    <div role="status" className="grid gap-1.5 empty:hidden">
      {reading.findings.map((finding) => (
        <div
          key={finding.message}
          className="grid gap-1.5 rounded-action bg-butter-tint px-3 py-2 text-sm"
        >
          <p className="flex items-start gap-2">
            <ToneGlyph tone="butter" className="mt-0.5 size-4" />
            {finding.message}
          </p>
          <span className="flex flex-wrap gap-2">
            <Press onPress={() => write(settledText(finding, 'measure', reading))}>
              Take {finding.measure}: {Math.round(finding.measureG)} g
            </Press>
            <Press onPress={() => write(settledText(finding, 'weight', reading))}>
              Take {Math.round(finding.writtenG)} g
              {finding.measureFor !== null && `: ${finding.measureFor}`}
            </Press>
          </span>
        </div>
      ))}
      {(choices.length > 0 || reading.kind === 'unread') && (
        <span className="flex flex-wrap gap-2 text-sm">
          {choices.map(({ part, name }) => (
            <Press
              key={name}
              onPress={() => dispatch({ type: 'pick', key: row.key, part, words: reading.words })}
            >
              {name}
            </Press>
          ))}
          {reading.kind === 'unread' && (
            <Press onPress={() => dispatch({ type: 'to-note', key: row.key })}>
              Keep it in the note
            </Press>
          )}
        </span>
      )}
    </div>
  );
}

function Press({
  onPress,
  children,
}: {
  readonly onPress: () => void;
  readonly children: React.ReactNode;
}) {
  return (
    <button
      type="button"
      onClick={onPress}
      className="min-h-9 rounded-action border-[1.5px] border-cobalt bg-enamel px-3 py-1 text-left font-semibold text-cobalt hover:bg-cobalt-tint"
    >
      {children}
    </button>
  );
}
