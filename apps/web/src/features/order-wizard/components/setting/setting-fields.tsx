import { place as places } from '#shared/contracts/vocabulary.ts';
import { formatDuration, formatTime } from '#shared/dates/format.ts';
import { parseTime } from '#shared/dates/parse-time.ts';
import { warmthOf } from '#shared/kitchen/heat.ts';
import { formatTemperature, parseDuration, parseTemperature } from '#shared/kitchen/measures.ts';
import { placeWords } from '#web/components/order/setting-words.ts';
import { Checkbox } from '#web/components/ui/checkbox.tsx';
import { ChipChoice } from '#web/components/ui/chips.tsx';
import { NumberField } from '#web/components/ui/number-field.tsx';
import { useAnswer } from '../../steps/use-answer.ts';
import { useWizard } from '../../wizard/wizard-context.ts';

const parsedTemperature = (lead: 'F' | 'C') => (text: string) => parseTemperature(text, lead);

/** Where it stands, how warm it gets, how long it is out, and how far it travels. */
export function SettingFields() {
  const { menu, values } = useWizard();
  const place = useAnswer('setting.place');
  const warmest = useAnswer('setting.warmestC');
  const minutesOut = useAnswer('setting.minutesOut');
  const drive = useAnswer('setting.driveMinutes');
  const served = useAnswer('setting.servedAt');
  const lead = menu.studio.temperatureLead;
  const reckoned = warmthOf({ ...values.setting, warmestC: null }, menu, values.day.date);
  return (
    <div className="grid gap-6">
      <ChipChoice
        name={place.name}
        legend="Place"
        error={place.error}
        chips={places.options.map((it) => ({ value: it, label: placeWords[it] }))}
        value={place.value}
        onValue={place.onValue}
      />
      <div className="grid gap-6 sm:grid-cols-2">
        <NumberField
          name={warmest.name}
          label="Warmest"
          hint="In °F or °C."
          inputMode="text"
          read={parsedTemperature(lead)}
          write={(value) => formatTemperature(value, lead)}
          error={warmest.error}
          className="font-display text-lg font-semibold tabular-nums"
          value={warmest.value}
          onValue={warmest.onValue}
        />
        <NumberField
          name={minutesOut.name}
          label="Out before cutting"
          hint="Setting up included. Like 45 min or 1 h 30."
          inputMode="text"
          read={parseDuration}
          write={formatDuration}
          error={minutesOut.error}
          className="font-display text-lg font-semibold tabular-nums"
          value={minutesOut.value}
          onValue={(value) => minutesOut.onValue(value ?? Number.NaN)}
        />
        <NumberField
          name={drive.name}
          label="Drive"
          hint="From our counter to there."
          inputMode="text"
          read={parseDuration}
          write={formatDuration}
          error={drive.error}
          className="font-display text-lg font-semibold tabular-nums"
          value={drive.value}
          onValue={(value) => drive.onValue(value ?? Number.NaN)}
        />
        <NumberField
          name={served.name}
          label="Cut at"
          hint="Like 16:00. Then we can say how long it stays in the fridge."
          optional
          inputMode="text"
          read={parseTime}
          write={formatTime}
          error={served.error}
          className="font-display text-lg font-semibold tabular-nums"
          value={served.value}
          onValue={served.onValue}
        />
      </div>
      <Checkbox
        label="I don’t know how warm it will be"
        hint={`Then we reckon with ${formatTemperature(reckoned.celsius, lead)}, what we have seen at that time of year, and ask you again shortly before.`}
        checked={warmest.value === null}
        onChange={(event) =>
          warmest.onValue(event.target.checked ? null : Math.round(reckoned.celsius))
        }
      />
    </div>
  );
}
