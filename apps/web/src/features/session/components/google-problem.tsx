import { Notice } from '#web/components/ui/notice.tsx';

const sentences: Readonly<Record<string, string>> = {
  'google-denied':
    'You stopped at Google’s page, so nothing has changed. Try again, or ask for a link by e-mail.',
  'google-failed':
    'Google did not answer us properly. Try again in a minute, or ask for a link by e-mail.',
  'google-unverified':
    'Google has not verified that address, so we cannot take it as yours. Ask for a link by e-mail instead.',
  'google-staff':
    'That address belongs to somebody of the studio’s staff. Sign in below with your password; you can add Google afterwards.',
  'google-ended': 'That account has been closed. Write to the studio if that surprises you.',
  'google-taken': 'That Google account is already joined to another account here.',
};

/** What went wrong on the way to Google and back, by the word in the address. */
export function GoogleProblem({ problem }: { readonly problem: string | null }) {
  if (problem === null) return null;
  return (
    <Notice tone="berry" title="You are not signed in" live="assertive">
      <p>{sentences[problem] ?? 'That did not work out. Please try again.'}</p>
    </Notice>
  );
}
