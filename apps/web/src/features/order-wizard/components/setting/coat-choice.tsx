import type { CoatRank } from '#shared/contracts/estimates.ts';
import { coveringIds, finishIds, type CoveringId } from '#shared/contracts/vocabulary.ts';
import { CoatSwatch } from '#web/components/coats/coat-swatch.tsx';
import { ChipChoice } from '#web/components/ui/chips.tsx';
import { Dots } from '#web/components/ui/dots.tsx';
import { Pending } from '#web/components/ui/pending.tsx';
import { RadioGroup, type RadioRow } from '#web/components/ui/radio-group.tsx';
import { coatOf, pickCovering, pickFromKey, pickKey } from '../../design/choose-coat.ts';
import { containsLine } from '../../design/contains.ts';
import { useProblemAt } from '../../steps/use-answer.ts';
import { useWizard } from '../../wizard/wizard-context.ts';
import { finishWords } from './finish-words.ts';
import { Verdict } from './verdict.tsx';

/** The covering, then the buttercreams ranked for the day, then how it is finished. */
export function CoatChoice() {
  const { menu, values, change, running } = useWizard();
  const { cake } = values;
  const { coating } = cake;
  const coatProblem = useProblemAt('cake.coating');
  const styleProblem = useProblemAt('cake.coating.style');
  const problem = coatProblem ?? styleProblem;
  const ranks = running.estimate?.ranks ?? [];
  const covering: CoveringId = coating?.covering ?? 'buttercream';
  const onMenu = menu.coverings.find((it) => it.id === covering);

  const take = (pick: ReturnType<typeof pickFromKey>) => {
    if (pick !== null) change({ cake: { ...cake, coating: coatOf(pick, coating, menu) } });
  };

  if (running.estimate === null) return <Pending what="Ranking what goes over it…" />;
  return (
    <section className="grid gap-6" aria-label="What goes over it">
      <ChipChoice
        name="cake.coating.covering"
        large
        legend="What goes over it"
        hint={onMenu?.blurb}
        chips={coveringIds
          .flatMap((id) => menu.coverings.find((it) => it.id === id) ?? [])
          .map((it) => ({ value: it.id, label: it.name }))}
        value={coating === null ? null : covering}
        onValue={(id) => take(pickCovering(id, coating, ranks, menu))}
      />
      {covering === 'ganache' ? (
        <RanksNote rank={ranks.find((it) => it.covering === 'ganache')} />
      ) : (
        <RadioGroup
          name="cake.coating"
          large
          legend={
            covering === 'buttercream'
              ? 'Buttercreams, best for that first'
              : 'The buttercream under it, best for that first'
          }
          error={problem}
          rows={ranks.filter((it) => it.covering === covering).flatMap((it) => styleRow(it) ?? [])}
          value={coating === null ? null : pickKey(coating)}
          onValue={(key) => take(pickFromKey(key, ranks))}
        />
      )}
      {coating !== null && (onMenu?.finishes.length ?? 0) > 1 && (
        <ChipChoice
          name="cake.coating.finish"
          legend="Finish"
          chips={finishIds
            .filter((it) => onMenu?.finishes.includes(it))
            .map((it) => ({ value: it, label: finishWords[it] }))}
          value={coating.finish}
          onValue={(finish) => change({ cake: { ...cake, coating: { ...coating, finish } } })}
        />
      )}
    </section>
  );

  function styleRow(rank: CoatRank): RadioRow<string> | null {
    const style = menu.styles.find((it) => it.id === rank.style);
    if (style === undefined) return null;
    return {
      value: pickKey(rank),
      label: style.name,
      picture: (
        <CoatSwatch menu={menu} covering="buttercream" style={style.id} className="w-16 sm:w-20" />
      ),
      description: (
        <span className="grid gap-1">
          <span>{style.blurb}</span>
          <span className="flex flex-wrap gap-x-3">
            <Dots label="Sweetness" value={style.sweetness} />
            <span>{containsLine(style.contents, menu.studio.labelRegion)}</span>
          </span>
        </span>
      ),
      verdict: <Verdict level={rank.level} sentence={rank.sentence} />,
    };
  }
}

function RanksNote({ rank }: { readonly rank: CoatRank | undefined }) {
  return rank === undefined ? null : (
    <p>
      <Verdict level={rank.level} sentence={rank.sentence} />
    </p>
  );
}
