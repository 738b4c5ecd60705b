import { formatLength } from '#shared/kitchen/measures.ts';
import { coatColour } from '#shared/kitchen/coat-colour.ts';
import { pipedEdge } from '#web/components/coats/piped-edge.ts';
import { deeper, lineOn } from '#web/components/coats/shades.ts';
import { Bands, Standing, decorationsPerTier } from './decorated.tsx';
import { Dimension } from './dimension.tsx';
import type { Box, ViewProps } from './layout.ts';
import { PipedWords } from './piped-words.tsx';
import { TierCoat } from './tier-coat.tsx';

const gap = 42;

/** A sheet cake: from above, where its words and pictures lie, and from the side; one scale. */
export function SheetView({ cake, look, menu, room, show, hatch }: ViewProps) {
  const size = menu.sheetSizes.find((it) => it.id === cake.sheet?.sizeId);
  if (size === undefined || cake.sheet === null) return null;
  const { boardMarginMm } = menu.kitchen;
  const across = size.widthMm + 2 * boardMarginMm;
  const scale = Math.min(
    0.9,
    room.width / across,
    (room.height - gap - 8) / (size.depthMm + 2 * boardMarginMm + size.heightMm),
  );
  const middle = room.x + room.width / 2;
  const width = size.widthMm * scale;
  const margin = boardMarginMm * scale;
  const depth = size.depthMm * scale;
  const height = size.heightMm * scale;
  const total = depth + 2 * margin + gap + height + 4;
  const from = room.y + (room.height - total) / 2;
  const top: Box = { x: middle - width / 2, y: from + margin, width, height: depth };
  const side: Box = { x: middle - width / 2, y: top.y + depth + margin + gap, width, height };
  const coat = cake.coating;
  const colour = coat === null ? '#ffffff' : coatColour(menu, coat);
  const placed = decorationsPerTier(look, menu, 1)[0] ?? [];
  const words = look?.words.map((it) => it.text).join(' ') ?? '';
  const tier = { ...cake.sheet, real: true };
  const lead = menu.studio.lengthLead;
  const flowered = placed.some((it) => ['flower', 'leaf', 'fruit'].includes(it.glyph));
  const pictured = placed.some((it) => it.glyph === 'print');
  // Flowers keep to the far corner, a picture to the near half, words have what is left.
  const corner = {
    tier: { ...standIn, ...tier },
    ...top,
    x: top.x + width * 0.2,
    y: top.y + depth * 0.2,
  };
  const nearHalf = { ...corner, ...top, y: top.y + depth * 0.42, height: depth * 0.56 };
  if (show === 'measures') {
    return (
      <g>
        <Dimension
          from={side.x}
          to={side.x + width}
          at={side.y + height + 24}
          text={formatLength(size.widthMm, lead)}
        />
        <Dimension
          from={top.y}
          to={top.y + depth}
          at={top.x + width + margin + 14}
          text={formatLength(size.depthMm, lead)}
          upright
        />
        <g fontSize="13" fill="var(--color-slate)">
          <text x={top.x - margin} y={top.y - margin - 8}>
            from above
          </text>
          <text x={side.x - margin} y={side.y - 15}>
            from the side, {formatLength(size.heightMm, lead)} high
          </text>
        </g>
      </g>
    );
  }
  return (
    <g>
      <rect
        x={top.x - margin}
        y={top.y - margin}
        width={width + 2 * margin}
        height={depth + 2 * margin}
        rx="3"
        fill="var(--color-cloud)"
        stroke="var(--color-ink)"
        strokeWidth="1.2"
      />
      <rect
        x={top.x}
        y={top.y}
        width={width}
        height={depth}
        rx="3"
        fill={coat === null ? 'var(--color-enamel)' : colour}
        stroke="var(--color-ink)"
        strokeWidth="1.6"
        strokeDasharray={coat === null ? '5 4' : undefined}
      />
      {coat?.finish === 'piped' && coat.style !== null && (
        <g strokeWidth="1" style={{ fill: deeper(colour), stroke: lineOn(colour) }}>
          <path d={`M${top.x + 2} ${top.y + 9} ${pipedEdge(coat.style, width - 4, 7)} z`} />
          <path d={`M${top.x + 2} ${top.y + depth - 2} ${pipedEdge(coat.style, width - 4, 7)} z`} />
        </g>
      )}
      <PipedWords
        box={{
          ...top,
          width: width * (flowered ? 0.78 : 1),
          height: depth * (pictured ? 0.56 : 1),
        }}
        text={words}
        ground={colour}
      />
      <Standing
        at={corner}
        above={undefined}
        placed={placed.filter((it) => it.glyph !== 'print')}
        index={0}
        scale={scale}
      />
      <Standing
        at={nearHalf}
        above={undefined}
        placed={placed.filter((it) => it.glyph === 'print')}
        index={0}
        scale={scale}
      />
      <rect
        x={side.x - margin}
        y={side.y + height}
        width={width + 2 * margin}
        height="4"
        rx="1.5"
        fill="var(--color-ink)"
      />
      <TierCoat box={side} tier={tier} coat={coat} menu={menu} hatch={hatch} />
      <Bands box={side} placed={placed} coat={coat} menu={menu} />
    </g>
  );
}

/** What a sheet lacks of a tier; only its top is drawn upon. */
const standIn = {
  shape: 'rectangle',
  widthMm: 0,
  depthMm: 0,
  heightMm: 0,
  keepsake: false,
  coating: null,
} as const;
