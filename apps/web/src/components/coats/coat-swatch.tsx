import type { Menu } from '#shared/contracts/menu.ts';
import type { CoveringId, StyleId } from '#shared/contracts/vocabulary.ts';
import { classNames } from '#web/lib/class-names.ts';
import { coatColour } from '#shared/kitchen/coat-colour.ts';
import { pipedEdge } from './piped-edge.ts';
import { deeper, lineOn, outlineOf } from './shades.ts';

type Props = {
  readonly menu: Menu;
  readonly covering: CoveringId;
  readonly style: StyleId | null;
  /** A tint, where one is chosen; else the food's own colour. */
  readonly colour?: string | null;
  readonly className?: string;
};

/**
 * A spoonful of a coat on plain white, its edge as it would stand: white, because any tint around
 * it would falsify ivory. Decoration: the words beside it name it.
 */
export function CoatSwatch({ menu, covering, style, colour = null, className }: Props) {
  const fill = coatColour(menu, { covering, style, colour });
  return (
    <svg
      viewBox="0 0 80 48"
      className={classNames('shrink-0 rounded-mark bg-enamel', className ?? 'w-20')}
      aria-hidden="true"
    >
      <g fill={fill} strokeWidth="1.5" strokeLinejoin="round" style={{ stroke: outlineOf(fill) }}>
        {covering === 'buttercream' && style !== null && <Buttercream style={style} fill={fill} />}
        {covering === 'fondant' && <Fondant fill={fill} />}
        {covering === 'ganache' && <Ganache fill={fill} />}
        {covering === 'semi-naked' && <SemiNaked menu={menu} fill={fill} />}
      </g>
    </svg>
  );
}

const tops: Record<StyleId, number> = {
  italian: 20,
  american: 20,
  swiss: 18,
  french: 22,
  german: 18,
  russian: 21,
};
const beadHeights: Record<StyleId, number> = {
  italian: 14,
  american: 9,
  swiss: 12,
  french: 13,
  german: 10,
  russian: 14,
};

function Buttercream({ style, fill }: { readonly style: StyleId; readonly fill: string }) {
  const top = tops[style];
  return (
    <>
      <path d={`M3 44V${top} ${pipedEdge(style, 74, beadHeights[style])} V44z`} />
      <g fill="none" strokeLinecap="round" style={{ stroke: lineOn(fill) }}>
        {style === 'american' && <path d="M13 29l9 2.5M35 28l8-1M52 33l9 2M24 38l7-1.5" />}
        {style === 'german' && <path d="M10 30q10-5 20-1t22-1 20-1M10 37.5q10-4 20-1t20 0" />}
        {style === 'italian' && <path d="M12 36q6-4 13 0t13 0 13 0 14 0" />}
        {style === 'french' && <path d="M21.5 24v7M40 24v7M58.5 24v7" />}
      </g>
    </>
  );
}

function Fondant({ fill }: { readonly fill: string }) {
  return (
    <>
      <path d="M5 44V22c0-8 4-11 11-11h48c7 0 11 3 11 11v22z" />
      <path
        d="M14 44c-1.5-6 1-9 .6-15M40 44c1.8-5-.6-7 .2-11M64 44c1.6-6-.8-8.5-.4-14"
        fill="none"
        strokeLinecap="round"
        style={{ stroke: lineOn(fill) }}
      />
    </>
  );
}

function Ganache({ fill }: { readonly fill: string }) {
  return (
    <>
      <path d="M4 44V12h72v32z" strokeLinejoin="miter" />
      <path
        d="M4 12h72v9c0 5-6 5-6 0 0-3-6-3-6 0v7c0 5-7 5-7 0v-6c0-4-7-4-7 0v3c0 5-6.5 5-6.5 0v-3c0-4-7-4-7 0v10c0 5-7 5-7 0v-9c0-4-6.5-4-6.5 0v4c0 5-6.5 5-6.5 0v-5c0-4-6.5-4-6.5 0v2c0 4-6 4-6 0z"
        style={{ fill: deeper(fill) }}
      />
    </>
  );
}

function SemiNaked({ menu, fill }: { readonly menu: Menu; readonly fill: string }) {
  const crumb = menu.sponges[0]?.colour ?? fill;
  return (
    <>
      <path d="M4 44V12h72v32z" fill={crumb} />
      <g stroke="none">
        <path d="M5 20.5h70v3H5zM5 32.5h70v3H5z" />
        <path
          d="M5 13h70v2.5c-9 3-14-.5-24 1.5s-14-1-24 .5-14-.5-22 .5zM5 27c7-3 12 1 20-1s9 2 15 1v3c-9 2-20-1-35 1zM50 38c8-2 15 1 25-1v6H52z"
          fillOpacity="0.85"
        />
      </g>
      <path d="M4 44V12h72v32z" fill="none" />
    </>
  );
}
