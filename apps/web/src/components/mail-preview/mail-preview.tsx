import { useState } from 'react';
import { ChipChoice } from '#web/components/ui/chips.tsx';

type Props = {
  readonly html: string;
  readonly text: string;
  /** Names the frame for those who cannot see it: "The e-mail to Rosa". */
  readonly title: string;
};

type Shown = 'html' | 'text';

/**
 * An e-mail exactly as it is: its HTML in a frame that may run nothing, open nothing and reach
 * nothing (a customer's words are in it), or its plain text.
 */
export function MailPreview({ html, text, title }: Props) {
  const [shown, setShown] = useState<Shown>('html');
  return (
    <div className="grid min-w-0 gap-3">
      <ChipChoice
        legend="Shown as"
        value={shown}
        onValue={setShown}
        chips={[
          { value: 'html', label: 'Designed' },
          { value: 'text', label: 'Plain text' },
        ]}
      />
      {shown === 'html' ? (
        <iframe
          title={title}
          srcDoc={withoutStyleSheet(html)}
          sandbox=""
          className="h-[26rem] w-full rounded-action border border-seam bg-enamel"
        />
      ) : (
        <pre
          role="region"
          aria-label={title}
          className="max-h-[26rem] overflow-auto rounded-action border border-seam bg-cloud p-4 font-sans text-sm whitespace-pre-wrap"
        >
          {text}
        </pre>
      )}
    </div>
  );
}

/**
 * A mail's look is in its attributes; its style sheet only turns it for dark rooms, and our own
 * pages' policy, which the frame inherits, lets no style sheet through.
 */
function withoutStyleSheet(html: string): string {
  return html.replace(/<style>[^<]*<\/style>/g, '');
}
