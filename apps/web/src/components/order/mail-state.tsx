import type { SentMailRow } from '#shared/contracts/staff.ts';
import { ToneGlyph, type Tone } from '#web/components/ui/notice.tsx';

const states: Readonly<
  Record<SentMailRow['state'], { readonly word: string; readonly tone: Tone }>
> = {
  queued: { word: 'waits to be sent', tone: 'plain' },
  leased: { word: 'being sent', tone: 'plain' },
  sent: { word: 'delivered to the mail server', tone: 'leaf' },
  'given-up': { word: 'could not be delivered', tone: 'berry' },
  dropped: { word: 'not sent: it was out of date', tone: 'plain' },
};

type Props = Pick<SentMailRow, 'state' | 'lastError'>;

/** What became of an e-mail, and why where it did not arrive. */
export function MailState({ state, lastError }: Props) {
  const { word, tone } = states[state];
  const failing = state === 'given-up' || (lastError !== null && state !== 'sent');
  return (
    <p className="flex gap-2 text-sm">
      <ToneGlyph tone={tone} className="size-4 translate-y-0.5" />
      <span className={state === 'given-up' ? 'font-semibold text-berry' : undefined}>
        {word}
        {failing && lastError !== null && <span className="font-normal">: {lastError}</span>}
      </span>
    </p>
  );
}
