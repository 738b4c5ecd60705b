import type { Advice } from '#shared/contracts/estimates.ts';
import type { AdviceLevel } from '#shared/contracts/vocabulary.ts';
import { formatDuration, formatMonth } from '#shared/dates/format.ts';
import {
  coatLimitC,
  fareInHeat,
  fareOfCoat,
  heatMarginC,
  usualRoomC,
  whereWords,
  type Warmth,
} from './heat.ts';
import { formatTemperature } from './measures.ts';
import { note } from './note.ts';
import { coatingName, type ResolvedCoating, type ResolvedTier } from './resolve-design.ts';
import { named, orList } from './sentences.ts';
import type { Situation } from './situation.ts';
import { fsis, minutesAllowed } from './time-out.ts';
import { otherCoats, otherFillings, type Way } from './ways-out.ts';

/** What the place, its warmth and the hours mean for coats, fillings and food safety. */
export function settingAdvice(situation: Situation): Advice[] {
  const { resolved, warmth } = situation;
  if (resolved.design.setting === null || warmth === null) return [];
  return [
    ...distinctCoats(resolved.tiers).flatMap((it) => coatAdvice(it, situation, warmth)),
    ...fillingAdvice(situation, warmth),
    ...timeAdvice(situation, warmth),
    ...driveAdvice(situation),
  ];
}

/** Each coat of the cake once: tiers often share one. */
export function distinctCoats(tiers: readonly ResolvedTier[]): ResolvedCoating[] {
  const coats = new Map<string, ResolvedCoating>();
  for (const { coating } of tiers) {
    if (coating !== null) coats.set(coatKey(coating), coating);
  }
  return [...coats.values()];
}

/** Names a coat in `about`: `buttercream-russian`, `ganache`. */
export const coatKey = ({ covering, style }: ResolvedCoating): string =>
  style === null ? covering.id : `${covering.id}-${style.id}`;

/** What people call a coat in a sentence about heat: the style where it is the outside. */
const outside = (coat: ResolvedCoating): string =>
  coat.covering.id === 'buttercream' && coat.style !== null ? coat.style.name : coatingName(coat);

function coatAdvice(coat: ResolvedCoating, situation: Situation, warmth: Warmth): Advice[] {
  const { setting } = situation.resolved.design;
  if (setting === null) return [];
  const limitC = coatLimitC(coat);
  const level = fareOfCoat(limitC, setting, warmth);
  if (setting.place === 'sun') return [sunAdvice(coat, limitC, situation, warmth)];
  const lead = situation.resolved.menu.studio.temperatureLead;
  const limit = formatTemperature(limitC, lead);
  const shared = { level, step: 'setting' } as const;
  // What would do by the figure we reckon with needs no other coat, only to be asked again.
  const ways =
    fareInHeat(limitC, warmth.celsius) === 'ok' ? [] : heatWays(coat, limitC, situation, warmth);
  if (!warmth.known) {
    return [
      note({
        ...shared,
        code: 'heat-unknown',
        about: `heat-unknown:${coatKey(coat)}`,
        sentence: `You do not know yet how warm it will be; ${reckoned(warmth, situation)} ${formatTemperature(warmth.celsius, lead)}. ${outside(coat)} holds to ${limit}.`,
        instead: `We ask you again three days before. ${standUp(ways)}`.trim(),
        ways,
        talk: level === 'stop',
      }),
    ];
  }
  const about = `heat:${coatKey(coat)}`;
  if (level === 'ok') {
    const sentence = `${outside(coat)} stands up well there; it holds to ${limit}.`;
    return [note({ ...shared, code: 'heat', about, sentence })];
  }
  const expected = formatTemperature(warmth.celsius, lead);
  return [
    note({
      ...shared,
      code: 'heat',
      about,
      sentence:
        level === 'stop'
          ? `Too warm ${whereWords[setting.place]} for ${outside(coat)}; it holds to ${limit}.`
          : `${outside(coat)} holds to ${limit}, and you expect ${expected}: that is close.`,
      instead: [
        standUp(ways),
        level === 'stop'
          ? 'Or show a dummy and keep a plain cutting cake cold in the kitchen.'
          : 'Cut it early rather than late.',
      ]
        .filter((it) => it !== '')
        .join(' '),
      ways,
      talk: level === 'stop',
    }),
  ];
}

function sunAdvice(
  coat: ResolvedCoating,
  limitC: number,
  situation: Situation,
  warmth: Warmth,
): Advice {
  const { setting } = situation.resolved.design;
  const shade: Way[] =
    setting === null || fareInHeat(limitC, warmth.celsius) === 'stop'
      ? []
      : [{ label: 'In the shade', patch: { setting: { ...setting, place: 'shade' } } }];
  return note({
    code: 'sun',
    level: 'stop',
    step: 'setting',
    about: `sun:${coatKey(coat)}`,
    sentence: `Direct sun melts ${outside(coat)}, however mild the day.`,
    instead: 'Stand it in the shade, or keep it inside until you cut it.',
    ways: [...shade, ...indoorsWays(limitC, situation)],
    talk: true,
  });
}

function reckoned(warmth: Warmth, { date }: Situation): string {
  return warmth.month === null || date === null
    ? 'for our warmest month we reckon with'
    : `for ${formatMonth(date).split(' ')[0] ?? ''} we reckon with`;
}

function heatWays(
  coat: ResolvedCoating,
  limitC: number,
  situation: Situation,
  warmth: Warmth,
): Way[] {
  const better = otherCoats(
    situation,
    coat,
    (it) => coatLimitC(it) > limitC && fareInHeat(coatLimitC(it), warmth.celsius) !== 'stop',
  );
  return [...better, ...indoorsWays(limitC, situation)];
}

/** A room no warmer than the coat likes. */
function indoorsWays(limitC: number, { resolved, warmth }: Situation): Way[] {
  const { setting } = resolved.design;
  if (setting === null || warmth === null) return [];
  const room = Math.min(usualRoomC, Math.floor(limitC - heatMarginC));
  if (setting.place === 'indoors' && warmth.celsius <= room) return [];
  const label = `Inside until cutting, at ${formatTemperature(room, resolved.menu.studio.temperatureLead)} or cooler`;
  return [{ label, patch: { setting: { ...setting, place: 'indoors', warmestC: room } } }];
}

/** "Italian meringue buttercream or Fondant over Swiss meringue would stand up." */
function standUp(ways: readonly Way[]): string {
  const coats = ways.filter((it) => it.patch.cake !== undefined).map((it) => it.label);
  return coats.length === 0 ? '' : `${orList(coats)} would stand up.`;
}

function fillingAdvice(situation: Situation, warmth: Warmth): Advice[] {
  const { tiers, menu } = situation.resolved;
  const seen = new Set<string>();
  return tiers.flatMap((tier): Advice[] => {
    const { filling } = tier;
    if (filling === null || warmth.celsius <= filling.holdsToC) return [];
    const bears = filling.soft && tier.index < tiers.length - 1;
    const about = `${bears ? 'soft-filling' : 'heat'}:filling-${filling.id}`;
    if (seen.has(about)) return [];
    seen.add(about);
    const name = named(filling.name, 'filling');
    const limit = formatTemperature(filling.holdsToC, menu.studio.temperatureLead);
    const ways = otherFillings(
      situation,
      filling,
      (it) => it.holdsToC >= warmth.celsius && !(bears && it.soft),
    );
    const level: AdviceLevel = bears ? 'stop' : 'care';
    return [
      note({
        code: bears ? 'soft-filling' : 'heat',
        level,
        step: 'setting',
        about,
        sentence: bears
          ? `${name} is soft and holds to ${limit}; under another tier it would slide on a day that warm.`
          : `${name} softens above ${limit}, so slices will be less neat.`,
        instead: ways.length === 0 ? 'Keep it colder until you cut it.' : 'These are firmer.',
        ways,
        talk: bears,
      }),
    ];
  });
}

/** Whether anything on the cake has to be kept cold: the owner's flag, by default yes. */
function perishable({ tiers }: Situation['resolved']): boolean {
  return tiers.some(
    ({ filling, coating }) =>
      filling !== null || coating === null || coating.style?.refrigerate !== false,
  );
}

function timeAdvice(situation: Situation, warmth: Warmth): Advice[] {
  const { design, menu, tiers } = situation.resolved;
  const { setting } = design;
  if (setting === null || tiers.length === 0 || !perishable(situation.resolved)) return [];
  const allowed = minutesAllowed(warmth.celsius);
  const out = setting.minutesOut + setting.driveMinutes;
  // Within a quarter of the limit a late speech is enough to pass it.
  if (out <= allowed * 0.75) return [];
  const level: AdviceLevel = out > allowed ? 'stop' : 'care';
  const hotDay = warmth.celsius > fsis.hotDayC;
  const lead = menu.studio.temperatureLead;
  const rule = hotDay
    ? `above ${formatTemperature(fsis.hotDayC, lead)} it may be out for ${formatDuration(allowed)} in all`
    : `it may be out for ${formatDuration(allowed)} in all`;
  const before = Math.floor((allowed - setting.driveMinutes) / 15) * 15;
  const shorter: Way[] =
    level === 'stop' && before > 0
      ? [
          {
            label: `Out of the fridge ${formatDuration(before)} before cutting`,
            patch: { setting: { ...setting, minutesOut: before } },
          },
        ]
      : [];
  return [
    note({
      code: 'time-out',
      level,
      step: 'setting',
      about: 'time-out',
      sentence:
        level === 'stop'
          ? `${formatDuration(out)} out of the fridge, the drive included, is too long: ${rule}.`
          : `${formatDuration(out)} out of the fridge, the drive included, is close: ${rule}.`,
      instead:
        level === 'care'
          ? 'Keep an eye on the clock.'
          : shorter.length > 0
            ? 'Leave it in the fridge for longer.'
            : 'Carry it in a cold box and put it in a fridge when you arrive.',
      ways: shorter,
      talk: level === 'stop',
    }),
  ];
}

/** Longer drives than this ask for a word about the car (memory). */
const longDriveMinutes = 45;

function driveAdvice({ resolved }: Situation): Advice[] {
  const { design, tiers } = resolved;
  if (design.setting === null || tiers.length === 0) return [];
  const { driveMinutes } = design.setting;
  if (driveMinutes < longDriveMinutes) return [];
  const stacked = tiers.length > 1;
  return [
    note({
      code: 'drive',
      level: 'care',
      step: 'setting',
      about: 'drive',
      sentence: `${formatDuration(driveMinutes)} is a long drive for ${stacked ? 'a stacked cake' : 'a cake'}.`,
      instead:
        'Cool the car first, stand the box level on the floor, not on a seat, and take corners gently.',
    }),
  ];
}
