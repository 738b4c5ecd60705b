import type { Coating } from '#shared/contracts/design.ts';
import type { Menu } from '#shared/contracts/menu.ts';
import { formatDuration, formatTime } from '#shared/dates/format.ts';
import { formatTemperature } from '#shared/kitchen/measures.ts';
import { coatingName } from '#shared/kitchen/resolve-design.ts';
import { tierName } from '#shared/kitchen/tier-name.ts';
import { placeWords } from '#web/components/order/setting-words.ts';
import { tidyOrder } from '../../../design/tidy-order.ts';
import type { OrderForm } from '../../../draft/empty-order.ts';
import { finishWords } from '../../setting/finish-words.ts';
import type { CheckRow } from '../check-rows.tsx';

/** Where it stands and what goes over it. */
export function settingRows(values: OrderForm, menu: Menu): CheckRow[] {
  const { cake, setting } = tidyOrder(values);
  const nameOf = (coat: Coating | null) => {
    const covering = menu.coverings.find((it) => it.id === coat?.covering);
    const style = menu.styles.find((it) => it.id === coat?.style) ?? null;
    return coat === null || covering === undefined
      ? 'Not chosen'
      : `${coatingName({ covering, style })}, ${finishWords[coat.finish].toLowerCase()}`;
  };
  const rows: CheckRow[] = [
    { label: 'Place', value: placeWords[setting.place], field: 'setting.place' },
    {
      label: 'Warmest',
      value:
        setting.warmestC === null
          ? 'Not known; we ask again'
          : formatTemperature(setting.warmestC, menu.studio.temperatureLead),
      field: 'setting.warmestC',
    },
    {
      label: 'Out before cutting',
      value: formatDuration(setting.minutesOut),
      field: 'setting.minutesOut',
    },
    { label: 'Drive', value: formatDuration(setting.driveMinutes), field: 'setting.driveMinutes' },
    ...(setting.servedAt === null
      ? []
      : [{ label: 'Cut at', value: formatTime(setting.servedAt), field: 'setting.servedAt' }]),
    { label: 'Over it', value: nameOf(cake.coating), field: 'cake.coating' },
  ];
  cake.tiers.forEach((tier, at) => {
    if (tier.coating === null) return;
    rows.push({
      label: tierName(at, cake.tiers.length),
      value: nameOf(tier.coating),
      field: `cake.tiers.${at}.coating`,
    });
  });
  return rows;
}
