import type { Coating } from '#shared/contracts/design.ts';
import type { DemoForm } from './demo-parts.ts';
import {
  agreed,
  coat,
  guestsOf,
  indoors,
  look,
  person,
  placed,
  round,
  tiered,
} from './demo-parts.ts';

type Placed = ReturnType<typeof placed>;

/** A cake like most: agreed to, eaten indoors, nothing to mind. */
function everyday(
  name: string,
  [headCount, occasionId]: readonly [number, string],
  cake: DemoForm['cake'],
  decorations: readonly Placed[],
  words?: string,
): DemoForm {
  return {
    day: guestsOf({ headCount, occasionId }),
    cake,
    setting: indoors,
    look: look({
      decorations: [...decorations],
      words: words === undefined ? [] : [{ tier: 0, text: words }],
    }),
    extras: [],
    you: person(name, `${name.toLowerCase().replaceAll(/[^a-z]+/g, '.')}@example.com`),
    consents: agreed,
  };
}

const sheet = (
  sizeId: string,
  spongeId: string,
  fillingId: string,
  coating: Coating,
): DemoForm['cake'] => ({
  kind: 'sheet',
  tiers: [],
  sheet: { sizeId, layers: 2, spongeId, fillingId },
  coating,
  cuttingCakes: [],
});

/** The rest of a busy book, in the order they are wanted. All people are invented. */
export const everydayForms = {
  halloran: everyday(
    'June Halloran',
    [36, 'anniversary'],
    tiered(coat('swiss'), round(9, 'honey', 'lemon-curd'), round(6, 'honey', 'lemon-curd')),
    [placed('wafer-ruffles', 0), placed('ribbon', 1)],
  ),
  abara: everyday(
    'Chidi Abara',
    [20, 'graduation'],
    tiered(coat('italian'), round(8, 'lemon', 'raspberry')),
    [placed('hand-lettering', 0), placed('pearls', 0)],
    'Well done, Ada',
  ),
  lindqvist: everyday(
    'Maja Lindqvist',
    [48, 'company'],
    sheet('half', 'vanilla', 'strawberry', coat('swiss')),
    [placed('piped-border', 0), placed('hand-lettering', 0)],
    'Ten years of Quarry Street',
  ),
  okafor: everyday(
    'Ngozi Okafor',
    [30, 'baby'],
    tiered(coat('swiss', { colour: '#f2e6c8' }), round(9, 'vanilla', 'passion-fruit')),
    [placed('sugar-leaves', 0, 6), placed('pressed-flowers', 0)],
  ),
  brandt: everyday(
    'Felix Brandt',
    [44, 'birthday'],
    tiered(
      coat(null, { covering: 'ganache' }),
      round(10, 'chocolate', 'salted-caramel'),
      round(6, 'chocolate', 'salted-caramel'),
    ),
    [placed('chocolate-drip', 0), placed('gold-leaf', 1)],
    'Sixty',
  ),
  moreau: everyday(
    'Celeste Moreau',
    [60, 'wedding'],
    tiered(
      coat('italian'),
      round(10, 'almond', 'raspberry'),
      round(7, 'lemon', 'raspberry'),
      round(5, 'vanilla', 'raspberry'),
    ),
    [placed('sugar-flower', 0, 5, '#f6d9e0'), placed('sugar-flower', 1, 4, '#f6d9e0')],
  ),
  tanaka: everyday(
    'Emi Tanaka',
    [18, 'birthday'],
    tiered(coat('russian', { finish: 'textured' }), round(8, 'orange-chiffon', 'vanilla-cream')),
    [placed('fresh-fruit', 0), placed('edible-print', 0)],
  ),
  novak: everyday(
    'Jan Novak',
    [54, 'retirement'],
    sheet('half', 'carrot', 'cream-cheese', coat('american', { finish: 'piped' })),
    [placed('piped-border', 0), placed('hand-lettering', 0)],
    'Thank you, Mr. Novak',
  ),
  delgado: everyday(
    'Pilar Delgado',
    [40, 'anniversary'],
    tiered(
      coat('swiss', { covering: 'fondant' }),
      round(9, 'chocolate', 'hazelnut'),
      round(7, 'vanilla', 'hazelnut'),
    ),
    [placed('fine-lace', 0), placed('sugar-flower', 1, 3)],
  ),
  kemp: everyday(
    'Arthur Kemp',
    [14, 'birthday'],
    tiered(coat('german', { covering: 'semi-naked' }), round(7, 'honey', 'strawberry')),
    [placed('fresh-fruit', 0)],
    'Arthur, 80',
  ),
  haddow: everyday(
    'Morag Haddow',
    [150, 'wedding'],
    {
      ...tiered(
        coat('swiss'),
        round(12, 'vanilla', 'raspberry'),
        round(9, 'lemon', 'raspberry'),
        round(6, 'vanilla', 'raspberry'),
      ),
      // The cake on show feeds 101; the rest is cut in the kitchen.
      cuttingCakes: [
        { sizeId: 'half', count: 1, layers: 2, spongeId: 'lemon', fillingId: 'raspberry' },
      ],
    },
    [placed('sugar-flower', 0, 6), placed('sugar-leaves', 1, 8), placed('ribbon', 2)],
  ),
  rossi: everyday(
    'Gianni Rossi',
    [26, 'child-birthday'],
    tiered(
      coat('american', { finish: 'textured' }),
      round(8, 'vanilla', 'chocolate-cream'),
      round(6, 'chocolate', 'chocolate-cream'),
    ),
    [placed('figure', 1), placed('sprinkles', 0)],
    'Sofia is five',
  ),
  whelan: everyday(
    'Aoife Whelan',
    [32, 'graduation'],
    tiered(coat('italian'), round(10, 'cocoa', 'raspberry')),
    [placed('hand-lettering', 0), placed('fine-lace', 0)],
    'Dr. Whelan',
  ),
  castro: everyday(
    'Bruno Castro',
    [90, 'company'],
    sheet('full', 'chocolate', 'chocolate-cream', coat('swiss')),
    [placed('piped-border', 0), placed('edible-print', 0)],
    'Harbor Hospital, thank you',
  ),
  yilmaz: everyday(
    'Defne Yilmaz',
    [50, 'anniversary'],
    tiered(coat('italian'), round(10, 'almond', 'pistachio'), round(7, 'almond', 'pistachio')),
    [placed('sugar-flower', 0, 4, '#8fb4d8'), placed('pearls', 1)],
  ),
  pereira: everyday(
    'Ines Pereira',
    [22, 'baby'],
    tiered(coat('swiss', { colour: '#dbe9f4' }), round(8, 'lemon', 'lemon-curd')),
    [placed('wafer-ruffles', 0)],
  ),
  osborne: everyday(
    'Kit Osborne',
    [38, 'birthday'],
    tiered(
      coat('swiss', { covering: 'fondant', colour: '#e7ecf8' }),
      round(9, 'vanilla', 'strawberry'),
      round(6, 'vanilla', 'strawberry'),
    ),
    [placed('figure', 1), placed('pearls', 0)],
    'Kit and Kay',
  ),
  fairweather: everyday(
    'Dot Fairweather',
    [46, 'retirement'],
    sheet('half', 'lemon', 'lemon-curd', coat('swiss')),
    [placed('pressed-flowers', 0), placed('hand-lettering', 0)],
    'Gone gardening',
  ),
  sandoval: everyday(
    'Lucia Sandoval',
    [64, 'wedding'],
    tiered(
      coat('italian'),
      round(10, 'honey', 'passion-fruit'),
      round(8, 'honey', 'passion-fruit'),
      round(6, 'honey', 'passion-fruit'),
    ),
    [placed('sugar-flower', 0, 5), placed('sugar-leaves', 0, 6), placed('fine-lace', 1)],
  ),
  ahmadi: everyday(
    'Parisa Ahmadi',
    [28, 'birthday'],
    tiered(coat('italian'), round(9, 'almond', 'pistachio')),
    [placed('sugar-flower', 0, 3), placed('gold-leaf', 0)],
  ),
  grier: everyday(
    'Walter Grier',
    [52, 'company'],
    sheet('half', 'chocolate', 'hazelnut', coat('american', { finish: 'piped' })),
    [placed('piped-border', 0)],
    'Grier and Daughters',
  ),
  vance: everyday(
    'Holly Vance',
    [24, 'other'],
    sheet('quarter', 'vanilla', 'raspberry', coat('swiss')),
    [placed('piped-border', 0), placed('sprinkles', 0)],
    'Welcome home',
  ),
} satisfies Record<string, DemoForm>;
