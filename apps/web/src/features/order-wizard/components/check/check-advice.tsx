import type { Advice } from '#shared/contracts/estimates.ts';
import { AdviceItem } from '../frame/advice-list.tsx';

const aboutAllergies: readonly Advice['code'][] = ['allergen', 'allergen-unknown', 'kitchen'];

/** What still stands against the cake, the gravest first; good news needs no reading here. */
export function CheckAdvice({ advice }: { readonly advice: readonly Advice[] }) {
  const stops = advice.filter((it) => it.level === 'stop');
  const cares = advice.filter((it) => it.level === 'care');
  if (stops.length + cares.length === 0) return null;
  return (
    <section className="grid gap-3" aria-labelledby="advice-heading">
      <h2 id="advice-heading">{stops.length > 0 ? 'To settle with the baker' : 'To look after'}</h2>
      {stops.length > 0 && (
        <p className="measure text-slate">
          You can send it as it is: the baker talks to you about these before anything is agreed.
        </p>
      )}
      {stops.length === 0 && cares.some((it) => aboutAllergies.includes(it.code)) && (
        <p className="measure text-slate">
          You can send it as it is: a baker reads what you told us of allergies, and talks it over
          with you wherever it needs it, before anything is promised.
        </p>
      )}
      <ul className="grid gap-3">
        {[...stops, ...cares].map((it) => (
          <AdviceItem key={`${it.code} ${it.about}`} step="check" advice={it} />
        ))}
      </ul>
    </section>
  );
}
