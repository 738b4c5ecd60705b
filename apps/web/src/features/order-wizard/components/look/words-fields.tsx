import { countCharacters, wordsFit } from '#shared/kitchen/words-fit.ts';
import { tierName } from '#shared/kitchen/tier-name.ts';
import { TextField } from '#web/components/ui/text-field.tsx';
import { useWizard } from '../../wizard/wizard-context.ts';
import { Spelled } from './spelled.tsx';

/** What the contract takes at most, whatever the width. */
const longest = 80;

/** Words piped on each tier (or the sheet), as long as there is room, spelled back as typed. */
export function WordsFields() {
  const { menu, values, change } = useWizard();
  const { cake, look } = values;
  const sheet = menu.sheetSizes.find((it) => it.id === cake.sheet?.sizeId);
  const places =
    cake.kind === 'sheet'
      ? [{ tier: 0, name: 'On the sheet', widthMm: sheet?.widthMm ?? 300 }]
      : cake.tiers.map((it, at) => ({
          tier: at,
          name: cake.tiers.length === 1 ? 'On the cake' : tierName(at, cake.tiers.length),
          widthMm: it.widthMm,
        }));

  const put = (tier: number, text: string) => {
    const others = look.words.filter((it) => it.tier !== tier);
    const words = text === '' ? others : [...others, { tier, text }];
    change({ look: { ...look, words: words.toSorted((a, b) => a.tier - b.tier) } });
  };

  return (
    <section className="grid gap-5" aria-labelledby="words-heading">
      <div className="grid gap-1">
        <h2 id="words-heading">Words on the cake</h2>
        <p className="text-slate">We pipe exactly what you write, so read it twice.</p>
      </div>
      {places.toReversed().map(({ tier, name, widthMm }) => {
        const at = look.words.findIndex((it) => it.tier === tier);
        const text = look.words[at]?.text ?? '';
        const room = Math.min(longest, wordsFit(widthMm, menu));
        const over = countCharacters(text.trim()) - room;
        return (
          <div key={tier} className="grid gap-2">
            <TextField
              name={`look.words.${tier}`}
              label={name}
              optional
              hint={`Room for ${room} characters; ${Math.max(0, -over)} left.`}
              error={over > 0 ? `That is ${over} too many for this width.` : undefined}
              maxLength={longest}
              dir="auto"
              value={text}
              onChange={(event) => put(tier, event.target.value)}
            />
            <Spelled text={text} />
          </div>
        );
      })}
    </section>
  );
}
