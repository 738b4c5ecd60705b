import type { KitchenRules } from '#shared/contracts/kitchen-rules.ts';
import type { FigureKind } from './figure-kinds.ts';

export type RuleField = {
  readonly name: keyof KitchenRules;
  readonly label: string;
  readonly kind: FigureKind;
  /** After the field, of a plain number. */
  readonly unit?: string;
};

export type RuleGroup = {
  readonly title: string;
  readonly about: string;
  readonly fields: readonly RuleField[];
};

type Told = readonly [name: keyof KitchenRules, label: string, unit?: string];

const all = (kind: FigureKind, fields: readonly Told[]): RuleField[] =>
  fields.map(([name, label, unit]) => ({
    name,
    label,
    kind,
    ...(unit === undefined ? {} : { unit }),
  }));

/** Every figure of the kitchen once, as a baker looks for them. */
export const ruleGroups: readonly RuleGroup[] = [
  {
    title: 'Coats and piping',
    about: 'How much buttercream a cake takes. Density and losses are each formula’s own.',
    fields: [
      ...all('thin', [
        ['crumbCoatMm', 'Crumb coat'],
        ['finalCoatMm', 'Final coat'],
        ['underFondantMm', 'Coat under fondant'],
        ['footBeadMm', 'Bead at the foot'],
        ['pipedBeadMm', 'Bead of a piped border'],
        ['damMm', 'Dam around a soft filling'],
      ]),
      ...all('number', [['letterG', 'A piped letter', 'g']]),
      ...all('share', [['bowlAndBagPpm', 'Stays in bowl and bag']]),
    ],
  },
  {
    title: 'Tins',
    about: 'What a sponge is baked in, and how full.',
    fields: [
      ...all('length', [
        ['shallowTinMm', 'Shallow tin'],
        ['middleTinMm', 'Middle tin'],
        ['deepTinMm', 'Deep tin'],
        ['highestInOneTinMm', 'Highest sponge from one tin'],
      ]),
      ...all('share', [
        ['tinFillLeastPpm', 'Filled at least'],
        ['tinFillMostPpm', 'Filled at most'],
      ]),
    ],
  },
  {
    title: 'Tiers',
    about: 'How tiers are stacked and cut. A tier over the double height has a board inside.',
    fields: [
      ...all('length', [
        ['doubleHeightMm', 'Double height'],
        ['smallestStepMm', 'Smallest step between tiers'],
        ['largestStepMm', 'Largest step between tiers'],
        ['usualHeightMm', 'Usual height of a tier'],
        ['largestKeepsakeMm', 'Largest tier to keep'],
        ['twoLayersUpToMm', 'Two layers up to'],
      ]),
      ...all('thin', [['narrowestCoreMm', 'Narrowest core cut out']]),
    ],
  },
  {
    title: 'What is proposed',
    about:
      'Which cakes customers are shown for their number of guests, and how much too much is worth a word.',
    fields: [
      ...all('number', [
        ['oneTierPortions', 'One tier up to', 'portions'],
        ['twoTierPortions', 'Two tiers up to', 'portions'],
        ['threeTierPortions', 'Three tiers up to', 'portions'],
        ['fourTierPortions', 'Four tiers up to', 'portions'],
        ['mostTiers', 'Most tiers', 'tiers'],
      ]),
      ...all('share', [
        ['someOverPpm', '“Some over” has more by'],
        ['plentyPpm', 'A smaller cake is named from'],
      ]),
    ],
  },
  {
    title: 'Large tables and sheets',
    about: 'When a cake on show is offered with cutting cakes in the kitchen.',
    fields: [
      ...all('number', [
        ['cuttingFromPortions', 'Cutting cakes from', 'portions'],
        ['fewestTiersOnShow', 'On show at least', 'tiers'],
      ]),
      ...all('share', [
        ['showLeastPpm', 'The show feeds at least'],
        ['showBestPpm', 'The show feeds best'],
        ['showMostPpm', 'The show feeds at most'],
        ['sheetOverPpm', 'A sheet may leave over'],
      ]),
      ...all('number', [['sheetOverPortions', 'Or leave over', 'portions']]),
    ],
  },
  {
    title: 'Boards, dowels and the fridge',
    about:
      'What is hidden in a cake and comes out before eating, what a cake weighs as it is carried, and the room it takes while it chills.',
    fields: [
      ...all('length', [['boardMarginMm', 'Board shows all round']]),
      ...all('thin', [
        ['boardThicknessMm', 'Board’s thickness'],
        ['cardThicknessMm', 'Card under a tier'],
      ]),
      ...all('number', [
        ['boardGPerMl', 'Board’s density', 'g/mL'],
        ['cardGPerMl', 'Card’s density', 'g/mL'],
        ['dummyGPerMl', 'Foam’s density', 'g/mL'],
        ['fewestDowels', 'Dowels at least', 'dowels'],
      ]),
      ...all('length', [['mmPerDowel', 'A dowel for each']]),
      ...all('share', [['dowelReachPpm', 'Dowels stand out to']]),
      ...all('length', [
        ['fridgeMarginMm', 'Room around a tier, chilled'],
        ['fridgeHeadroomMm', 'Room over a tier, chilled'],
      ]),
    ],
  },
  {
    title: 'What stands on top',
    about: 'How far above the cake it reaches: part of its height as it is carried.',
    fields: all('length', [
      ['topperStandsMm', 'A topper'],
      ['figureStandsMm', 'A figure'],
      ['flowerStandsMm', 'Flowers'],
      ['fruitStandsMm', 'Fruit'],
      ['leafStandsMm', 'Leaves'],
      ['borderStandsMm', 'A border'],
    ]),
  },
  {
    title: 'Heat, time and the look',
    about:
      'When advice says “care”. The hours a cake may be out and the cold it is kept at are food rules (USDA FSIS, FDA Food Code) and are not set here; local rules come first.',
    fields: [
      ...all('degrees', [['heatMarginC', 'Fine this far under a limit']]),
      ...all('warmth', [['usualRoomC', 'A room, whatever the day']]),
      ...all('share', [['closeToTimePpm', 'Time out is close from']]),
      ...all('minutes', [['longDriveMinutes', 'A long drive']]),
      ...all('length', [['largeTierMm', 'A large tier, slow to soften']]),
      ...all('number', [
        ['softenLeastHours', 'Softens in at least', 'h'],
        ['softenMostHours', 'Softens in at most', 'h'],
        ['roughUpTo', 'Hard to smooth up to', 'of 5'],
        ['closeBelow', 'A color is close under (CIEDE2000)'],
        ['shiftsBelow', 'A color shifts under (CIEDE2000)'],
      ]),
    ],
  },
];
