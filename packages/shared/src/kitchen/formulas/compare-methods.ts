import type { FormulaStep, FormulaVersion } from '#shared/contracts/pantry.ts';
import { formatDuration } from '#shared/dates/format.ts';
import { formatBenchTemperature, type TemperatureLead } from '#shared/kitchen/measures.ts';
import type { VersionChange } from './compare-versions.ts';

/** How a version is made and kept otherwise than an earlier one. */
export function compareMethods(
  before: FormulaVersion,
  after: FormulaVersion,
  lead: TemperatureLead,
): VersionChange[] {
  const degrees = (c: number) => formatBenchTemperature(c, lead);
  const change = (kind: VersionChange['kind'], what: string, old: string, now: string) =>
    old === now ? [] : [{ kind, text: `${what}: ${old} → ${now}.` }];
  const hours = (it: number | null) => (it === null ? 'not said' : formatDuration(it * 60));
  return [
    ...change('yield', 'Yield', ppm(before.yieldPpm), ppm(after.yieldPpm)),
    ...change('yield', 'Bake loss', ppm(before.bakeLossPpm), ppm(after.bakeLossPpm)),
    ...change('yield', 'Weight of 1 mL', `${before.densityGPerMl} g`, `${after.densityGPerMl} g`),
    ...stepChanges(before.steps, after.steps, degrees),
    ...change('limit', 'Holds to', holds(before, degrees), holds(after, degrees)),
    ...flag('keeping', before.refrigerate, after.refrigerate, {
      now: 'It is refrigerated now.',
      nowNot: 'It is not refrigerated any more: by a tested reason or the local authority’s word.',
    }),
    ...flag('limit', before.pasteurisedByDefault, after.pasteurisedByDefault, {
      now: 'It takes pasteurized egg by default now.',
      nowNot: 'It does not take pasteurized egg by default any more.',
    }),
    ...change('keeping', 'At room', hours(before.keepsRoomHours), hours(after.keepsRoomHours)),
    ...change(
      'keeping',
      'Chilled',
      hours(before.keepsChilledHours),
      hours(after.keepsChilledHours),
    ),
    ...change('keeping', 'Frozen', hours(before.keepsFrozenHours), hours(after.keepsFrozenHours)),
    ...change('look', 'Base color', before.baseColour ?? 'none', after.baseColour ?? 'none'),
    ...(before.note === after.note
      ? []
      : [{ kind: 'note', text: 'The note reads differently.' } as const]),
  ];
}

const ppm = (value: number) => `${Number((value / 10_000).toFixed(4))} %`;

function holds({ holdsToC }: FormulaVersion, degrees: (c: number) => string): string {
  return holdsToC === null ? 'not said' : degrees(holdsToC);
}

function flag(
  kind: VersionChange['kind'],
  before: boolean,
  after: boolean,
  words: { readonly now: string; readonly nowNot: string },
): VersionChange[] {
  return before === after ? [] : [{ kind, text: after ? words.now : words.nowNot }];
}

/** Steps go together by their words, else by their place; what is left is new or gone. */
function stepChanges(
  before: readonly FormulaStep[],
  after: readonly FormulaStep[],
  degrees: (c: number) => string,
): VersionChange[] {
  const step = (text: string): VersionChange => ({ kind: 'step', text });
  const sameWords = new Map<FormulaStep, FormulaStep>();
  const open = [...before];
  for (const it of after) {
    const at = open.findIndex((old) => old.text === it.text);
    const [old] = at < 0 ? [] : open.splice(at, 1);
    if (old !== undefined) sameWords.set(it, old);
  }
  const changes: VersionChange[] = [];
  const kept: FormulaStep[] = [];
  for (const [at, it] of after.entries()) {
    const own = sameWords.get(it);
    const reworded = before[at];
    const inPlace = reworded !== undefined && open.includes(reworded) ? reworded : undefined;
    const old = own ?? inPlace;
    if (old === undefined) {
      changes.push(step(`Step ${at + 1} is new: ${it.text}`));
      continue;
    }
    if (own === undefined) {
      open.splice(open.indexOf(old), 1);
      changes.push(step(`Step ${at + 1} reads: ${it.text}`));
    }
    kept.push(old);
    changes.push(...withinStep(at + 1, old, it, degrees));
  }
  for (const it of open) {
    changes.push(step(`Step ${before.indexOf(it) + 1} is gone: ${it.text}`));
  }
  const inOrder = kept.every((it, at) => at === 0 || isBefore(before, kept[at - 1], it));
  if (!inOrder) changes.push({ kind: 'order', text: 'The steps stand in another order.' });
  return changes;
}

function isBefore(
  steps: readonly FormulaStep[],
  a: FormulaStep | undefined,
  b: FormulaStep,
): boolean {
  return a !== undefined && steps.indexOf(a) < steps.indexOf(b);
}

function withinStep(
  n: number,
  before: FormulaStep,
  after: FormulaStep,
  degrees: (c: number) => string,
): VersionChange[] {
  const change = (kind: VersionChange['kind'], what: string, old: string, now: string) =>
    old === now ? [] : [{ kind, text: `Step ${n}, ${what}: ${old} → ${now}.` }];
  const syrup = (it: FormulaStep) => (it.syrupTargetC === null ? 'none' : degrees(it.syrupTargetC));
  return [
    ...change('limit', 'limit', limitWords(before, degrees), limitWords(after, degrees)),
    ...change('limit', 'syrup to', syrup(before), syrup(after)),
    ...change('step', 'hands', minutes(before.activeMinutes), minutes(after.activeMinutes)),
    ...change('step', 'waiting', minutes(before.waitingMinutes), minutes(after.waitingMinutes)),
    ...change('step', 'at', before.resource, after.resource),
  ];
}

const minutes = (value: number) => (value === 0 ? 'none' : formatDuration(value));

function limitWords({ critical }: FormulaStep, degrees: (c: number) => string): string {
  if (critical === null) return 'none';
  const { limitC, seconds, note } = critical;
  const time =
    seconds === null
      ? ''
      : seconds < 60
        ? ` (${seconds} s)`
        : ` (${formatDuration(Math.round(seconds / 60))})`;
  return `${degrees(limitC)}${time}${note === '' ? '' : `, ${note}`}`;
}
