import { workTimes, type WorkTimes } from '#shared/dates/work-times.ts';
import type { Equipment as BenchEquipment } from '#shared/dates/expansion.ts';
import { Equipment } from '#api/db/models/equipment.ts';
import { NoticeRule } from '#api/db/models/notice-rule.ts';
import { Occasion } from '#api/db/models/occasion.ts';
import { WorkTimeVersion } from '#api/db/models/work-time-version.ts';

/** What a design is expanded with. */
export type PlanSettings = {
  readonly workTimeVersionId: string;
  readonly workTimes: WorkTimes;
  readonly equipment: BenchEquipment;
  readonly noticeByItem: ReadonlyMap<string, number>;
  readonly noticeByOccasion: ReadonlyMap<string, number>;
};

/** Reads the studio's times, machines and notice. */
export async function loadPlanSettings(): Promise<PlanSettings> {
  const [times, machines, rules, occasions] = await Promise.all([
    WorkTimeVersion.findOne({ order: [['n', 'DESC']], rejectOnEmpty: true }),
    Equipment.findAll({ where: { active: true } }),
    NoticeRule.findAll(),
    Occasion.findAll(),
  ]);
  return {
    workTimeVersionId: times.id,
    workTimes: workTimes.parse(times.content),
    equipment: benchEquipment(machines),
    noticeByItem: new Map(rules.map((it) => [it.itemKind, it.days])),
    noticeByOccasion: new Map(occasions.map((it) => [it.id, it.noticeDays])),
  };
}

/** The times an order was planned with, which may be older than the studio's present ones. */
export async function loadWorkTimes(versionId: string): Promise<WorkTimes> {
  const version = await WorkTimeVersion.findByPk(versionId, { rejectOnEmpty: true });
  return workTimes.parse(version.content);
}

/** Bowls and loads are counted by the smallest machine, since any may be the one that is free. */
function benchEquipment(machines: readonly Equipment[]): BenchEquipment {
  const bowls = machines.filter((it) => it.kind === 'mixer').map((it) => it.capacityMg ?? 0);
  const decks = machines
    .filter((it) => it.kind === 'oven-deck')
    .map((it) => (it.widthMm ?? 0) * (it.depthMm ?? 0));
  return {
    bowlG: Math.max(1, Math.floor(Math.min(...bowls, Infinity) / 1000) || 1),
    decks: Math.max(1, decks.length),
    deckMm2: Math.max(1, Math.min(...decks, Number.MAX_SAFE_INTEGER)),
  };
}
