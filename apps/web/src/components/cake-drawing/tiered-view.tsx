import type { Menu } from '#shared/contracts/menu.ts';
import { formatLength, lengthFigure } from '#shared/kitchen/measures.ts';
import { coatColour } from '#shared/kitchen/coat-colour.ts';
import { Bands, Standing, decorationsPerTier, reachAbove } from './decorated.tsx';
import { Dimension } from './dimension.tsx';
import { type TierBox, type ViewProps, layOutTiers, measureGap } from './layout.ts';
import { PipedWords } from './piped-words.tsx';
import { TierCoat } from './tier-coat.tsx';

/** A tiered cake from the side, to scale, on its board. */
export function TieredView({ cake, look, menu, room, show, hatch }: ViewProps) {
  const { tiers, board, scale } = layOutTiers(cake, menu, room);
  const perTier = decorationsPerTier(look, menu, cake.tiers.length);
  if (show === 'measures') {
    return (
      <Measures
        menu={menu}
        tiers={tiers}
        floor={board.y}
        boardEnd={board.x + board.width}
        reach={reachAbove(perTier.at(-1) ?? [], scale)}
      />
    );
  }
  return (
    <g>
      <rect
        x={board.x}
        y={board.y}
        width={board.width}
        height={board.height}
        rx="1.5"
        fill="var(--color-ink)"
      />
      {tiers.map((box, at) => {
        const coat = box.tier.coating ?? cake.coating;
        const words = look?.words.filter((it) => it.tier === at).map((it) => it.text) ?? [];
        return (
          <g key={at}>
            <TierCoat box={box} tier={box.tier} coat={coat} menu={menu} hatch={hatch} />
            <Bands box={box} placed={perTier[at] ?? []} coat={coat} menu={menu} />
            <PipedWords
              box={box}
              text={words.join(' ')}
              ground={coat === null ? '#ffffff' : coatColour(menu, coat)}
            />
          </g>
        );
      })}
      {tiers.map((box, at) => (
        <Standing
          key={at}
          at={box}
          above={tiers[at + 1]}
          placed={perTier[at] ?? []}
          index={at}
          scale={scale}
        />
      ))}
    </g>
  );
}

type MeasuresProps = {
  readonly menu: Menu;
  readonly tiers: readonly TierBox[];
  readonly floor: number;
  readonly boardEnd: number;
  readonly reach: number;
};

function Measures({ menu, tiers, floor, boardEnd, reach }: MeasuresProps) {
  const lowest = tiers[0];
  const highest = tiers.at(-1);
  if (lowest === undefined || highest === undefined) return null;
  const lead = menu.studio.lengthLead;
  const heightMm = tiers.reduce((sum, { tier }) => sum + tier.heightMm, 0);
  return (
    <g>
      {tiers.map((box, at) => (
        <TierName key={at} box={box} menu={menu} width={at > 0 && at < tiers.length - 1} />
      ))}
      {tiers.length > 1 && (
        <Dimension
          from={highest.x}
          to={highest.x + highest.width}
          at={highest.y - measureGap - reach}
          text={`${lengthFigure(highest.tier.widthMm, lead)} ${lead}`}
          side="before"
        />
      )}
      <Dimension
        from={lowest.x}
        to={lowest.x + lowest.width}
        at={floor + 22}
        text={formatLength(lowest.tier.widthMm, lead)}
      />
      <Dimension
        from={highest.y}
        to={floor}
        at={boardEnd + 14}
        text={formatLength(heightMm, lead)}
        upright
      />
    </g>
  );
}

const longestName = 13;

function TierName({
  box,
  menu,
  width,
}: {
  readonly box: TierBox;
  readonly menu: Menu;
  readonly width: boolean;
}) {
  const { tier } = box;
  const lead = menu.studio.lengthLead;
  const sponge = menu.sponges.find((it) => it.id === tier.spongeId)?.name;
  const lines = [
    ...(tier.real ? broken((sponge ?? '').toLowerCase()) : ['dummy']),
    tier.keepsake ? 'keepsake' : '',
    tier.shape === 'round' ? '' : tier.shape,
  ].filter((it) => it !== '');
  const middle = box.y + box.height / 2;
  const first = middle - ((lines.length - (width ? 0 : 1)) * 15) / 2 + 4;
  return (
    <g fontSize="13" textAnchor="end" fill="var(--color-slate)">
      {lines.map((line, at) => (
        <text key={line} x={box.x - 9} y={first + at * 15}>
          {line}
        </text>
      ))}
      {width && (
        <text x={box.x - 9} y={first + lines.length * 15} fill="var(--color-cobalt)">
          {lengthFigure(tier.widthMm, lead)} {lead}
        </text>
      )}
    </g>
  );
}

/** A name in lines short enough for the margin. */
function broken(name: string): string[] {
  const lines: string[] = [];
  for (const word of name.split(' ')) {
    const last = lines.at(-1);
    if (last !== undefined && last.length + word.length < longestName)
      lines[lines.length - 1] = `${last} ${word}`;
    else lines.push(word);
  }
  return lines.slice(0, 2);
}
