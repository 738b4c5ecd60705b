import { Link } from 'react-router-dom';
import { Section } from '#web/components/ui/section.tsx';
import { paths } from '#web/config/paths.ts';

type Props = { readonly code: string; readonly careCode: string };

/** Where the customer finds what goes home with the cake, before it does. */
export function CareCardLinks({ code, careCode }: Props) {
  return (
    <Section title="Care card">
      <p className="measure">
        How to keep it, what comes out before eating, what is in it and how it is cut. It goes home
        with the cake; the page can be passed on to whoever serves it and tells nothing about you.
      </p>
      <p className="flex flex-wrap gap-x-6 gap-y-2">
        <a
          href={`/api/orders/${encodeURIComponent(code)}/care-card.pdf`}
          target="_blank"
          rel="noreferrer"
          className="link inline-block py-1"
        >
          The care card, to print
        </a>
        <Link to={paths.cakeCare(careCode)} className="link inline-block py-1">
          The page about this cake
        </Link>
      </p>
    </Section>
  );
}
