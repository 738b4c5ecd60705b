import * as z from 'zod/mini';
import { id } from './common.ts';

const figure = (usual: number, least: number, most: number, unit = '') => {
  const message = `From ${least} to ${most}${unit}, please.`;
  return z._default(
    z.number(message).check(z.minimum(least, message), z.maximum(most, message)),
    usual,
  );
};

const mm = (usual: number, least: number, most: number) => figure(usual, least, most, ' mm');
const celsius = (usual: number, least: number, most: number) => figure(usual, least, most, ' °C');
const gPerMl = (usual: number) => figure(usual, 0.001, 3, ' g/mL');

const whole = (usual: number, least: number, most: number, unit = '') => {
  const message = `A whole number from ${least} to ${most}${unit}, please.`;
  return z._default(
    z.int(message).check(z.minimum(least, message), z.maximum(most, message)),
    usual,
  );
};

/** A share in parts per million, told in percent. */
const share = (usual: number, leastPercent: number, mostPercent: number) => {
  const message = `From ${leastPercent} to ${mostPercent} %, please.`;
  return z._default(
    z
      .int(message)
      .check(z.minimum(leastPercent * 10_000, message), z.maximum(mostPercent * 10_000, message)),
    usual,
  );
};

/**
 * The studio's own figures for what the kitchen does; `{}` reads as the usual ones. Laws (FSIS
 * hours, Food Code temperatures) and units are no settings and stay in code. Thicknesses of coats,
 * the tenth for bowl and bag, double height, steps, the margin under a limit and the bounds of a
 * color are from the kitchen's definition; all others are from trade memory, without a source.
 */
export const kitchenRules = z
  .object({
    crumbCoatMm: mm(2, 0, 15),
    finalCoatMm: mm(4, 0, 20),
    /** The one coat that lies under fondant. */
    underFondantMm: mm(3, 0, 15),
    /** What stays in bowl and bag, of what is on the cake. */
    bowlAndBagPpm: share(100_000, 0, 50),
    /** Width of the ring of frosting that holds a soft filling. */
    damMm: mm(10, 0, 30),
    /** Bead at the foot of a smooth or textured tier, and of the borders of a piped one. */
    footBeadMm: mm(8, 0, 30),
    pipedBeadMm: mm(12, 0, 40),
    /** Piped lettering, a bead of 3 mm and some 150 mm of it. */
    letterG: figure(1, 0, 20, ' g'),

    /** Tins, and how high a sponge one of them bakes evenly. */
    shallowTinMm: mm(51, 20, 200),
    middleTinMm: mm(76, 20, 200),
    deepTinMm: mm(102, 20, 200),
    highestInOneTinMm: mm(76, 20, 200),
    /** Batter stands from one of these up to the other of its tin. */
    tinFillLeastPpm: share(500_000, 10, 100),
    tinFillMostPpm: share(666_667, 10, 100),

    /** Above this height a tier has an inner board and is cut two portions deep. */
    doubleHeightMm: mm(130, 80, 180),
    /** Between stacked tiers, edge to edge across the cake. */
    smallestStepMm: mm(50, 0, 150),
    largestStepMm: mm(130, 20, 300),
    mostTiers: whole(6, 1, 6),
    /** Tiers are proposed at the height that is nearest to this. */
    usualHeightMm: mm(102, 75, 180),
    largestKeepsakeMm: mm(160, 100, 400),
    /** Lower tiers are proposed with two layers, higher ones with three, double ones with four. */
    twoLayersUpToMm: mm(90, 0, 180),
    /** Up to so many portions a table has one tier, two, three, four. */
    oneTierPortions: whole(28, 1, 10_000),
    twoTierPortions: whole(60, 1, 10_000),
    threeTierPortions: whole(120, 1, 10_000),
    fourTierPortions: whole(200, 1, 10_000),
    /** "Some over" has this much more than wanted. */
    someOverPpm: share(100_000, 0, 100),
    /** From so much more on, a smaller cake is worth a word. */
    plentyPpm: share(400_000, 5, 500),
    /** A narrower core is cut with the ring round it. */
    narrowestCoreMm: mm(25, 0, 100),

    /** What the cake's board shows all round, and its thickness. */
    boardMarginMm: mm(50, 0, 150),
    boardThicknessMm: mm(12, 1, 40),
    boardGPerMl: gPerMl(0.4),
    /** The card under a tier. */
    cardThicknessMm: mm(3, 0, 20),
    cardGPerMl: gPerMl(0.6),
    dummyGPerMl: gPerMl(0.03),
    /** A dowel for so much of the width it bears. */
    mmPerDowel: mm(40, 15, 200),
    fewestDowels: whole(4, 3, 12),
    /** How far out dowels stand under what they bear. */
    dowelReachPpm: share(700_000, 30, 95),
    /** How far above the cake a thing reaches that stands on top. */
    topperStandsMm: mm(120, 0, 600),
    figureStandsMm: mm(80, 0, 600),
    flowerStandsMm: mm(50, 0, 600),
    fruitStandsMm: mm(40, 0, 300),
    leafStandsMm: mm(30, 0, 300),
    borderStandsMm: mm(10, 0, 100),
    /** Room round a tier on its board, and over it, in the fridge. */
    fridgeMarginMm: mm(40, 0, 150),
    fridgeHeadroomMm: mm(20, 0, 150),

    /** Smaller tables see the whole cake cut. */
    cuttingFromPortions: whole(80, 1, 10_000),
    /** What the cake on show feeds of the whole. */
    showLeastPpm: share(300_000, 1, 99),
    showMostPpm: share(750_000, 1, 99),
    showBestPpm: share(500_000, 1, 99),
    fewestTiersOnShow: whole(3, 1, 6),
    /** A sheet that leaves more than both is not proposed. */
    sheetOverPpm: share(350_000, 0, 300),
    sheetOverPortions: whole(8, 0, 100),

    /** At least so far under a limit is `ok`; from there up to the limit is `care`. */
    heatMarginC: celsius(3, 0, 10),
    /** How people keep their rooms, however cold the day. */
    usualRoomC: celsius(22, 10, 35),
    /** Of the time a cake may be out; more is close. */
    closeToTimePpm: share(750_000, 10, 100),
    longDriveMinutes: whole(45, 5, 600, ' minutes'),
    /** From this width on a tier takes long to soften, and how long. */
    largeTierMm: mm(225, 100, 700),
    softenLeastHours: figure(1, 0.25, 12, ' hours'),
    softenMostHours: figure(3, 0.25, 12, ' hours'),
    /** Styles up to this, of five, are hard to get smooth. */
    roughUpTo: whole(2, 0, 5),

    /** CIEDE2000 under which a color comes `close`, and under which it `shifts`. */
    closeBelow: figure(3, 0.5, 20),
    shiftsBelow: figure(10, 1, 50),
  })
  .check((context) => {
    const it = context.value;
    const rising = (names: readonly (keyof typeof it)[], message: string) => {
      names.slice(1).forEach((name, at) => {
        const before = names[at];
        if (before !== undefined && it[name] < it[before]) {
          context.issues.push({ code: 'custom', path: [name], message, input: it });
        }
      });
    };
    rising(
      ['shallowTinMm', 'middleTinMm', 'deepTinMm'],
      'No less deep than the tin before it, please.',
    );
    rising(['tinFillLeastPpm', 'tinFillMostPpm'], 'No less than the least, please.');
    rising(['smallestStepMm', 'largestStepMm'], 'No less than the smallest step, please.');
    rising(
      ['oneTierPortions', 'twoTierPortions', 'threeTierPortions', 'fourTierPortions'],
      'No fewer than with a tier less, please.',
    );
    rising(
      ['showLeastPpm', 'showBestPpm', 'showMostPpm'],
      'Best between the least and the most, please.',
    );
    rising(['softenLeastHours', 'softenMostHours'], 'No less than the least, please.');
    rising(['closeBelow', 'shiftsBelow'], 'No less than what counts as close, please.');
  });
export type KitchenRules = z.infer<typeof kitchenRules>;

/** What a studio goes by that has set nothing. */
export const usualKitchen: KitchenRules = kitchenRules.parse({});

const warmest = z
  .number('Write a temperature.')
  .check(
    z.minimum(-40, 'Colder than we can reckon with.'),
    z.maximum(60, 'Warmer than we can reckon with.'),
  );

/** The kitchen's figures, and those of the studio that the kitchen goes by. */
const settings = {
  rules: kitchenRules,
  altitudeM: z
    .int('Write the height above the sea.')
    .check(z.minimum(-450, 'Lower than any shore.'), z.maximum(6000, 'Higher than any kitchen.')),
  /** The warmest hour by month, °C, January first: what "don't know" is reckoned with. */
  monthlyWarmestC: z.array(warmest).check(z.length(12, 'Write all twelve months.')),
  /** Head counts are multiplied by this where other desserts are served. */
  dessertFactorPpm: z
    .int('From 5 to 100 %, please.')
    .check(
      z.minimum(50_000, 'From 5 to 100 %, please.'),
      z.maximum(1_000_000, 'From 5 to 100 %, please.'),
    ),
  /** Characters of lettering per 100 mm of a tier's width, in two lines. */
  wordsPer100Mm: z
    .int('A whole number from 1 to 60, please.')
    .check(
      z.minimum(1, 'A whole number from 1 to 60, please.'),
      z.maximum(60, 'A whole number from 1 to 60, please.'),
    ),
};

/** `GET /api/staff/kitchen-rules`: as they are now. */
export const kitchenSettings = z.object({
  /** Changes with every save; a save names the one it began from. */
  version: id,
  ...settings,
});
export type KitchenSettings = z.infer<typeof kitchenSettings>;

/** `PUT /api/staff/kitchen-rules` */
export const saveKitchenRules = z.object({ version: id, ...settings });
export type SaveKitchenRules = z.infer<typeof saveKitchenRules>;
