import { LinkButton } from '#web/components/ui/link-button.tsx';
import { PageTitle } from '#web/components/ui/page-title.tsx';

type Props = { readonly what: 'ingredient' | 'formula'; readonly back: string };

/** An address of the pantry that leads to nothing. */
export function NotInPantry({ what, back }: Props) {
  return (
    <div className="grid justify-items-start gap-4">
      <PageTitle title={`There is no such ${what}`} />
      <p className="measure">The address may be mistyped, or come from another studio’s pantry.</p>
      <LinkButton to={back}>To all {what}s</LinkButton>
    </div>
  );
}
