import { useEffect } from 'react';
import { useLocation } from 'react-router-dom';
import { formatDay } from '#shared/dates/format.ts';
import { PageTitle } from '#web/components/ui/page-title.tsx';
import { Prose } from '#web/components/ui/prose.tsx';
import { useMenu } from '#web/features/menu/api/get-menu.ts';

/** Everything the studio asks one to agree to, as it stands now. */
export function PoliciesPage() {
  const { policies, studio } = useMenu();
  const { hash } = useLocation();

  useEffect(() => {
    if (hash !== '') document.getElementById(hash.slice(1))?.scrollIntoView();
  }, [hash]);

  return (
    <div className="page grid gap-10 py-8">
      <header className="grid gap-4">
        <PageTitle title="Policies and privacy" />
        <nav aria-label="On this page" className="flex flex-wrap gap-x-5">
          {policies.map((it) => (
            <a key={it.kind} href={`#${it.kind}`} className="link inline-block py-2">
              {it.title}
            </a>
          ))}
        </nav>
      </header>
      {policies.map((it) => (
        <section key={it.kind} id={it.kind} className="grid scroll-mt-6 gap-3">
          <h2>{it.title}</h2>
          <Prose text={it.text} />
          <p className="text-sm text-slate">
            In force since{' '}
            {formatDay(it.since, { locale: studio.locale, weekday: false, year: true })}.
          </p>
        </section>
      ))}
    </div>
  );
}
