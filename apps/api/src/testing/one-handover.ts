import { PickupWindow } from '#api/db/models/pickup-window.ts';
import { WeeklyPickupWindow } from '#api/db/models/weekly-pickup-window.ts';
import { weekdayOf } from '#shared/dates/local-time.ts';

/** Leaves a day one handover, at ten; called in a transaction that notes the change of settings. */
export async function leaveOneHandover(day: string): Promise<void> {
  const weekly = await WeeklyPickupWindow.findAll({ where: { weekday: weekdayOf(day) } });
  await PickupWindow.bulkCreate(
    weekly.map(({ startMinute, minutes }) => ({
      localDate: day,
      startMinute,
      minutes,
      handovers: startMinute === 600 ? 1 : 0,
    })),
  );
}
