import type { Menu } from '#shared/contracts/menu.ts';
import { tierName } from '#shared/kitchen/tier-name.ts';
import { colourName } from '../../../design/colour-name.ts';
import { orderToSend } from '../../../design/tidy-order.ts';
import type { KeptPicture } from '../../../draft/draft-record.ts';
import type { OrderForm } from '../../../draft/empty-order.ts';
import { ColourDot } from '../../look/colour-dot.tsx';
import { PictureThumbnail } from '../../look/photo-row.tsx';
import { sourceWords } from '../../look/source-words.ts';
import { Spelled } from '../../look/spelled.tsx';
import type { CheckRow } from '../check-rows.tsx';

/** Colours, words spelled back, decorations, extras, pictures. */
export function lookRows(
  values: OrderForm,
  menu: Menu,
  pictures: Readonly<Record<string, KeptPicture>>,
): CheckRow[] {
  const { cake, look, extras, photos } = orderToSend(values, null);
  const place = (tier: number | null) =>
    tier === null || cake.tiers.length < 2 ? '' : tierName(tier, cake.tiers.length).toLowerCase();
  const rows: CheckRow[] = [
    {
      label: 'Color of the coat',
      value: cake.coating?.colour ? <Colours colours={[cake.coating.colour]} /> : 'As it is',
      field: 'cake.coating.colour',
    },
  ];
  if (look.palette.length > 0) {
    rows.push({
      label: 'Colors on it',
      value: <Colours colours={look.palette} />,
      field: 'look.palette',
    });
  }
  for (const { tier, text } of look.words) {
    rows.push({
      label: place(tier) === '' ? 'Words' : `Words, ${place(tier)}`,
      value: <Spelled text={text} />,
      field: `look.words.${tier}`,
    });
  }
  if (look.words.length === 0) rows.push({ label: 'Words', value: 'None', field: 'look.words.0' });
  look.decorations.forEach((placed, at) => {
    const onMenu = menu.decorations.find((it) => it.id === placed.decorationId);
    const parts = [
      place(placed.tier),
      placed.colour === null ? '' : colourName(placed.colour).toLowerCase(),
      placed.source === 'studio' ? '' : sourceWords[placed.source].toLowerCase(),
    ].filter((it) => it !== '');
    rows.push({
      label: at === 0 ? 'Decorations' : 'and',
      value: `${placed.quantity} × ${onMenu?.name ?? ''}${parts.length > 0 ? ` (${parts.join(', ')})` : ''}`,
      field: `look.decorations.${at}.quantity`,
    });
  });
  extras.forEach((it, at) => {
    const onMenu = menu.extras.find((known) => known.id === it.extraId);
    rows.push({
      label: at === 0 ? 'To go with it' : 'and',
      value: `${it.quantity} × ${onMenu?.name ?? ''}`,
      field: `extras.${it.extraId}`,
    });
  });
  photos.forEach(({ id, note }, at) => {
    const picture = pictures[id];
    rows.push({
      label: `Picture ${at + 1}`,
      value: (
        <span className="flex items-center gap-3">
          <PictureThumbnail
            thumbnail={picture?.thumbnail ?? null}
            name={picture?.name ?? `Picture ${at + 1}`}
          />
          {note}
        </span>
      ),
      field: `photos.${at}.note`,
    });
  });
  if (look.note.trim() !== '') {
    rows.push({
      label: 'Your note',
      value: <span className="whitespace-pre-line">{look.note}</span>,
      field: 'look.note',
    });
  }
  return rows;
}

function Colours({ colours }: { readonly colours: readonly string[] }) {
  return (
    <span className="flex flex-wrap gap-x-4 gap-y-1">
      {colours.map((it) => (
        <span key={it} className="inline-flex items-center gap-2">
          <ColourDot colour={it} /> {colourName(it)}
        </span>
      ))}
    </span>
  );
}
