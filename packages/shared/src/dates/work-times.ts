import * as z from 'zod/mini';
import { styleId } from '#shared/contracts/vocabulary.ts';

/**
 * The studio's own times for each kind of work. Versioned: an order keeps the version it was
 * planned with. Defaults are common practice, no source; a studio measures its own.
 */

const minutes = z.int().check(z.minimum(0), z.maximum(24 * 60));
/** A day (trade memory, no source); versions kept before this was a setting read it too. */
const dryingMinutes = 24 * 60;

const hours = z.int().check(z.minimum(0), z.maximum(24 * 365));

/** Minutes of one bowl or load, and minutes by weight. */
const byWeight = z.object({ perBowl: minutes, perKg: minutes });
export type ByWeight = z.infer<typeof byWeight>;

export const workTimes = z.object({
  bake: z.object({
    /** Weighing, mixing, panning and turning out, hands on. */
    ...byWeight.shape,
    /** Mixer minutes of one bowl of batter. */
    mixerPerBowl: minutes,
    /** One load in the oven. */
    ovenPerLoad: minutes,
  }),
  custard: byWeight,
  /** The mixer runs alone for a part of it. */
  buttercream: z.record(
    styleId,
    z.object({ ...byWeight.shape, mixerPerBowl: minutes, custard: z.boolean() }),
  ),
  filling: byWeight,
  ganache: byWeight,
  /** Per tier, and per square decimetre of what is covered. */
  fillAndCrumbCoat: z.object({ perTier: minutes, perLayer: minutes, perDm2Tenths: minutes }),
  finalCoat: z.object({
    perTier: minutes,
    perDm2Tenths: minutes,
    texturedAdd: minutes,
    pipedAdd: minutes,
  }),
  cover: z.object({ perTier: minutes, perDm2Tenths: minutes }),
  lettering: z.object({
    fixed: minutes,
    perCharacterTenths: minutes,
    skill: z.nullable(z.string()),
  }),
  /** Putting on what was made ahead or came from elsewhere, per kind of decoration. */
  setOn: minutes,
  stack: z.object({ fixed: minutes, perTier: minutes }),
  box: z.object({ fixed: minutes, perTier: minutes }),
  gaps: z.object({
    bakeToFill: minutes,
    /** For sponges at least `largeMm` across. */
    largeBakeToFill: minutes,
    largeMm: z.int(),
    custardToButtercream: minutes,
    fillingToFill: minutes,
    fillToFinalCoat: minutes,
    finalCoatToDecorate: minutes,
    finalCoatToStack: minutes,
    /** Sugar flowers, figures and plaques dry so long before they go on. */
    dryBeforeSettingOn: z._default(minutes, dryingMinutes),
  }),
  keeps: z.object({
    spongeHours: hours,
    custardHours: hours,
    buttercreamHours: hours,
    fillingHours: hours,
    madeAheadHours: hours,
    /** What a florist brings is put on at most so long before the pickup. */
    freshFlowersHours: hours,
    /** From the fill to the serving. */
    finishedHours: hours,
    /** Serving, counted from the pickup window's end. */
    servedAfterHours: hours,
  }),
  /** Longer work is split into parts of at most this. */
  longestPiece: z.int().check(z.minimum(30), z.maximum(8 * 60)),
});
export type WorkTimes = z.infer<typeof workTimes>;

export const defaultWorkTimes: WorkTimes = {
  bake: { perBowl: 20, perKg: 4, mixerPerBowl: 15, ovenPerLoad: 45 },
  custard: { perBowl: 20, perKg: 5 },
  buttercream: {
    american: { perBowl: 15, perKg: 3, mixerPerBowl: 12, custard: false },
    swiss: { perBowl: 30, perKg: 4, mixerPerBowl: 30, custard: false },
    italian: { perBowl: 35, perKg: 4, mixerPerBowl: 35, custard: false },
    french: { perBowl: 35, perKg: 4, mixerPerBowl: 35, custard: false },
    german: { perBowl: 25, perKg: 4, mixerPerBowl: 25, custard: true },
    russian: { perBowl: 15, perKg: 3, mixerPerBowl: 15, custard: false },
  },
  filling: { perBowl: 20, perKg: 6 },
  ganache: { perBowl: 15, perKg: 5 },
  fillAndCrumbCoat: { perTier: 12, perLayer: 3, perDm2Tenths: 8 },
  finalCoat: { perTier: 12, perDm2Tenths: 10, texturedAdd: 8, pipedAdd: 20 },
  cover: { perTier: 18, perDm2Tenths: 12 },
  lettering: { fixed: 10, perCharacterTenths: 10, skill: 'lettering' },
  setOn: 10,
  stack: { fixed: 10, perTier: 8 },
  box: { fixed: 12, perTier: 4 },
  gaps: {
    bakeToFill: 120,
    largeBakeToFill: 180,
    largeMm: 250,
    custardToButtercream: 60,
    fillingToFill: 30,
    fillToFinalCoat: 30,
    finalCoatToDecorate: 20,
    finalCoatToStack: 120,
    dryBeforeSettingOn: dryingMinutes,
  },
  keeps: {
    spongeHours: 72,
    custardHours: 48,
    buttercreamHours: 120,
    fillingHours: 72,
    madeAheadHours: 24 * 60,
    freshFlowersHours: 36,
    finishedHours: 120,
    servedAfterHours: 24,
  },
  longestPiece: 120,
};
