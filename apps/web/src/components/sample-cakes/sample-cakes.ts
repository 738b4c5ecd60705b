import type { Coating, Design, Tier } from '#shared/contracts/design.ts';
import type { Menu } from '#shared/contracts/menu.ts';

export type SampleCake = { readonly id: string; readonly name: string; readonly design: Design };

/** About 4 in: what a tier is unless somebody asks otherwise. */
const usualHeightMm = 102;

function closest(list: readonly number[], wanted: number): number | undefined {
  return [...list].sort((a, b) => Math.abs(a - wanted) - Math.abs(b - wanted))[0];
}

/** Made of what the studio's own menu has, so that every drawing is a cake one could order. */
export function sampleCakes(menu: Menu): readonly SampleCake[] {
  const rounds = menu.tierSizes
    .filter((it) => it.shape === 'round')
    .sort((a, b) => a.widthMm - b.widthMm);
  const near = (mm: number) =>
    [...rounds].sort((a, b) => Math.abs(a.widthMm - mm) - Math.abs(b.widthMm - mm))[0];
  const at = <T>(list: readonly T[], index: number): T | undefined =>
    list[index % Math.max(1, list.length)];

  const tier = (mm: number, flavour: number): Tier[] => {
    const size = near(mm);
    const sponge = at(menu.sponges, flavour);
    const filling = at(menu.fillings, flavour);
    if (size === undefined || sponge === undefined || filling === undefined) return [];
    return [
      {
        shape: 'round',
        widthMm: size.widthMm,
        depthMm: size.depthMm,
        heightMm: closest(size.heightsMm, usualHeightMm) ?? usualHeightMm,
        layers: 3,
        real: true,
        keepsake: false,
        spongeId: sponge.id,
        fillingId: filling.id,
        coating: null,
      },
    ];
  };
  const glyph = (...kinds: string[]) =>
    kinds.flatMap((kind) => menu.decorations.find((it) => it.glyph === kind) ?? []);
  const placed = (
    kind: string,
    tierIndex: number | null,
    quantity: number,
    colour: string | null = null,
  ) =>
    glyph(kind).map((it) => ({
      decorationId: it.id,
      tier: tierIndex,
      quantity: it.per === 'piece' ? quantity : 1,
      colour,
      source: it.sources[0] ?? ('studio' as const),
    }));
  const coat = (style: Coating['style'], finish: Coating['finish']): Coating => ({
    covering: 'buttercream',
    style,
    finish,
    colour: null,
  });
  const design = (
    headCount: number,
    tiers: Tier[],
    coating: Coating,
    decorations: ReturnType<typeof placed>,
    words = '',
  ): Design => ({
    guests: {
      headCount,
      occasionId: menu.occasions[0]?.id ?? '',
      otherDesserts: false,
      portionSizeId: 'dessert',
      allergies: [],
      diets: [],
      dietNote: '',
      infants: false,
      susceptible: false,
    },
    cake: { kind: 'tiered', tiers, sheet: null, coating, cuttingCakes: [] },
    setting: { place: 'indoors', warmestC: 20, minutesOut: 60, driveMinutes: 20, servedAt: null },
    look: {
      palette: [],
      words: words === '' ? [] : [{ tier: 0, text: words }],
      decorations,
      note: '',
    },
    extras: [],
  });

  return [
    {
      id: 'three-tiers',
      name: 'Three tiers for a wedding',
      design: design(
        70,
        [...tier(254, 1), ...tier(203, 0), ...tier(127, 2)],
        coat('italian', 'smooth'),
        [
          ...placed('flower', 0, 3),
          ...placed('leaf', 0, 3),
          ...placed('flower', 1, 2),
          ...placed('leaf', 1, 2),
        ],
      ),
    },
    {
      id: 'with-words',
      name: 'One tier with a name on it',
      design: design(
        20,
        tier(203, 0),
        coat('swiss', 'piped'),
        [...placed('sprinkle', 0, 1), ...placed('figure', null, 1)],
        'Six, Noor!',
      ),
    },
    {
      id: 'berries',
      name: 'Two tiers and the week’s berries',
      design: design(34, [...tier(203, 2), ...tier(127, 3)], coat('french', 'piped'), [
        ...placed('fruit', 0, 4),
        ...placed('leaf', 0, 2),
        ...placed('fruit', 1, 3),
      ]),
    },
  ].filter((it) => it.design.cake !== null && it.design.cake.tiers.length > 0);
}
