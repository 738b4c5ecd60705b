import type { PlacedDecoration } from '#shared/contracts/design.ts';
import type { Decoration } from '#shared/contracts/menu.ts';
import { formatMoney } from '#shared/kitchen/money.ts';
import { isPiped } from '#shared/kitchen/piped.ts';
import { DecorationGlyph } from '#web/components/cake-drawing/decoration-glyph.tsx';
import { Button } from '#web/components/ui/button.tsx';
import { Fold } from '#web/components/ui/fold.tsx';
import { capitalise } from '#shared/kitchen/sentences.ts';
import { formatList } from '#shared/dates/format.ts';
import { ToneGlyph } from '#web/components/ui/notice.tsx';
import { clashesOf, containsLine, contentsToSay } from '../../design/contains.ts';
import { useProblemAt } from '../../steps/use-answer.ts';
import { useWizard } from '../../wizard/wizard-context.ts';
import { DecorationRow } from './decoration-row.tsx';

const most = 40;
const per = { piece: 'each', tier: 'a tier', cake: 'for the cake' } as const;

/** What goes on the cake: chosen ones with where, how many and whose, then the studio's list. */
export function DecorationFields() {
  const { menu, values, change } = useWizard();
  const { look, cake } = values;
  const problem = useProblemAt('look.decorations');
  const put = (decorations: PlacedDecoration[], undo?: string) =>
    change({ look: { ...look, decorations } }, undo);
  const add = (it: Decoration) => {
    const top = cake.kind === 'sheet' ? null : Math.max(0, cake.tiers.length - 1);
    put([
      ...look.decorations,
      {
        decorationId: it.id,
        tier: it.per === 'cake' ? null : top,
        quantity: 1,
        colour: null,
        source: it.sources[0] ?? 'studio',
      },
    ]);
  };
  return (
    <section className="grid gap-5" aria-labelledby="decorations-heading">
      <h2 id="decorations-heading">Decorations</h2>
      {problem !== undefined && <p className="font-semibold text-berry">{problem}</p>}
      {look.decorations.length > 0 && (
        <ul className="grid gap-5">
          {look.decorations.map((placed, at) => (
            <DecorationRow
              key={at}
              at={at}
              placed={placed}
              onChange={(next) => put(look.decorations.map((it, i) => (i === at ? next : it)))}
              onRemove={() =>
                put(
                  look.decorations.filter((_, i) => i !== at),
                  'Decoration taken off.',
                )
              }
            />
          ))}
        </ul>
      )}
      {look.decorations.length >= most ? (
        <p className="text-slate">Forty are the most one order takes.</p>
      ) : (
        <Fold
          label={look.decorations.length === 0 ? 'What we make' : 'Add another'}
          open={look.decorations.length === 0}
        >
          <ul className="grid divide-y divide-seam">
            {menu.decorations.map((it) => (
              <li key={it.id} className="flex items-center gap-4 py-3">
                <DecorationGlyph glyph={it.glyph} />
                <div className="grid min-w-0 flex-1 gap-0.5">
                  <p className="font-semibold">{it.name}</p>
                  <p className="text-sm text-slate">
                    {it.blurb} {containsOf(it)}
                  </p>
                  <DoesNotSuit clashes={clashesWithTable(it)} />
                </div>
                <p className="shrink-0 text-right text-sm tabular-nums">
                  {formatMoney(it.priceMinor, menu.priceBook.currency, menu.studio.locale)}
                  <br />
                  <span className="text-slate">{per[it.per]}</span>
                </p>
                <Button kind="secondary" aria-label={`Add ${it.name}`} onClick={() => add(it)}>
                  Add
                </Button>
              </li>
            ))}
          </ul>
        </Fold>
      )}
    </section>
  );

  function containsOf(it: Decoration): string {
    const contents = contentsToSay(it);
    const said =
      contents === undefined
        ? ''
        : ` ${capitalise(containsLine(contents, menu.studio.labelRegion))}.`;
    if (it.edge === 'remove-before-eating') return `Comes off before eating.${said}`;
    if (it.edge === 'food-contact-only') return `Not for eating.${said}`;
    return isPiped(it) ? 'Contains what the coat contains.' : said.trim();
  }

  function clashesWithTable(it: Decoration): readonly string[] {
    const { allergies, diets } = values.day;
    return clashesOf(it.contents, allergies, diets, menu.studio.labelRegion);
  }
}

/** Said before it is chosen, so that nobody adds what their guest must not have. */
function DoesNotSuit({ clashes }: { readonly clashes: readonly string[] }) {
  if (clashes.length === 0) return null;
  return (
    <p className="flex gap-2 text-sm font-semibold text-berry">
      <ToneGlyph tone="berry" />
      Does not suit: {formatList(clashes)}.
    </p>
  );
}
