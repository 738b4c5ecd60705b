import type { AdviceLevel } from '#shared/contracts/vocabulary.ts';
import { formatMonth } from '#shared/dates/format.ts';
import { timeAdvice } from './advice-time.ts';
import { coatLimitC, fareInHeat, fareOfCoat, whereWords, type Warmth } from './heat.ts';
import { formatTemperature } from './measures.ts';
import { note, type Noted, type WayOut } from './note.ts';
import { coatingName, type ResolvedCoating, type ResolvedTier } from './resolve-design.ts';
import { named, orList } from './sentences.ts';
import { showWays } from './show-cake.ts';
import type { Situation } from './situation.ts';
import { heatWays, indoorsWays, otherFillings } from './ways-out.ts';

/** What the place, its warmth and the hours mean for coats, fillings and food safety. */
export function settingAdvice(situation: Situation): Noted[] {
  const { resolved, warmth } = situation;
  if (resolved.design.setting === null || warmth === null) return [];
  return [
    ...distinctCoats(resolved.tiers).flatMap((it) => coatAdvice(it, situation, warmth)),
    ...fillingAdvice(situation, warmth),
    ...timeAdvice(situation, warmth),
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

function coatAdvice(coat: ResolvedCoating, situation: Situation, warmth: Warmth): Noted[] {
  const { setting } = situation.resolved.design;
  if (setting === null) return [];
  const limitC = coatLimitC(coat);
  const { kitchen } = situation.resolved.menu;
  const level = fareOfCoat(limitC, setting, warmth, kitchen);
  if (setting.place === 'sun') return [sunAdvice(coat, limitC, situation, warmth)];
  const lead = situation.resolved.menu.studio.temperatureLead;
  const limit = formatTemperature(limitC, lead);
  const expected = formatTemperature(warmth.celsius, lead);
  const shared = { level, step: 'setting' } as const;
  // What would do by the figure we reckon with needs no other coat, only to be asked again.
  const fare = fareInHeat(limitC, warmth.celsius, kitchen);
  const ways = fare === 'ok' ? [] : waysFrom(coat, limitC, situation, fare);
  if (!warmth.known) {
    return [
      note({
        ...shared,
        code: 'heat-unknown',
        about: `heat-unknown:${coatKey(coat)}`,
        sentence: `You do not know yet how warm it will be; ${reckoned(warmth, situation)} ${expected}. ${coatingName(coat)} holds to ${limit}.`,
        plain: `Warmth not known, reckoned ${expected}; ${coatingName(coat)} holds to ${limit}. Ask again three days before.`,
        instead: `We ask you again three days before. ${standUp(ways)}`.trim(),
        ways,
        talk: level === 'stop',
      }),
    ];
  }
  const about = `heat:${coatKey(coat)}`;
  if (level === 'ok') {
    const sentence = `${coatingName(coat)} stands up well there; it holds to ${limit}.`;
    return [note({ ...shared, code: 'heat', about, sentence })];
  }
  return [
    note({
      ...shared,
      code: 'heat',
      about,
      sentence:
        level === 'stop'
          ? `Too warm ${whereWords[setting.place]} for ${coatingName(coat)}; it holds to ${limit}.`
          : `${coatingName(coat)} holds to ${limit}, and you expect ${expected}: that is close.`,
      plain: `${coatingName(coat)} holds to ${limit}; expected ${expected} ${whereWords[setting.place]}.`,
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
): Noted {
  const { design, menu } = situation.resolved;
  const { setting } = design;
  const shade: WayOut[] =
    setting === null || fareInHeat(limitC, warmth.celsius, menu.kitchen) === 'stop'
      ? []
      : [{ label: 'In the shade', patch: { setting: { ...setting, place: 'shade' } } }];
  return note({
    code: 'sun',
    level: 'stop',
    step: 'setting',
    about: `sun:${coatKey(coat)}`,
    sentence: `Direct sun melts ${coatingName(coat)}, however mild the day.`,
    plain: `Stands in direct sun: no coat holds there, ${coatingName(coat)} neither.`,
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

/** Another coat, a cooler place, and where it would be a stop also a dummy on show. */
function waysFrom(
  coat: ResolvedCoating,
  limitC: number,
  situation: Situation,
  fare: AdviceLevel,
): WayOut[] {
  const ways = heatWays(coat, limitC, situation);
  return fare === 'stop' ? [...ways, ...showWays(situation)] : ways;
}

/** "Italian meringue buttercream or Fondant over Swiss meringue would stand up." */
function standUp(ways: readonly WayOut[]): string {
  const coats = ways
    .filter((it) => it.patch.cake !== undefined && it.patch.cake.tiers.every((tier) => tier.real))
    .map((it) => it.label);
  return coats.length === 0 ? '' : `${orList(coats)} would stand up.`;
}

function fillingAdvice(situation: Situation, warmth: Warmth): Noted[] {
  const { tiers, menu } = situation.resolved;
  const seen = new Set<string>();
  return tiers.flatMap((tier): Noted[] => {
    const { filling } = tier;
    if (filling === null || warmth.celsius <= filling.holdsToC) return [];
    const bears = filling.soft && tier.index < tiers.length - 1;
    const about = `${bears ? 'soft-filling' : 'heat'}:filling-${filling.id}`;
    if (seen.has(about)) return [];
    seen.add(about);
    const name = named(filling.name, 'filling');
    const lead = menu.studio.temperatureLead;
    const limit = formatTemperature(filling.holdsToC, lead);
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
        plain: `${name} holds to ${limit}, reckoned ${formatTemperature(warmth.celsius, lead)}${bears ? ', and carries a tier' : ''}.`,
        instead: ways.length === 0 ? 'Keep it colder until you cut it.' : 'These are firmer.',
        ways: bears ? [...ways, ...indoorsWays(filling.holdsToC, situation)] : ways,
        talk: bears,
      }),
    ];
  });
}
