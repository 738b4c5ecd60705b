import { useWizard } from '../../wizard/wizard-context.ts';
import { CheckRows } from './check-rows.tsx';
import { cakeRows } from './rows/cake-rows.ts';
import { dayRows } from './rows/day-rows.ts';
import { lookRows } from './rows/look-rows.tsx';
import { settingRows } from './rows/setting-rows.ts';
import { youRows } from './rows/you-rows.ts';

/** Every answer, step by step. */
export function CheckAnswers() {
  const { menu, values, pictures } = useWizard();
  return (
    <>
      <CheckRows step="day" rows={dayRows(values, menu)} />
      <CheckRows step="cake" rows={cakeRows(values, menu)} />
      <CheckRows step="setting" rows={settingRows(values, menu)} />
      <CheckRows step="look" rows={lookRows(values, menu, pictures)} />
      <CheckRows step="you" rows={youRows(values)} />
    </>
  );
}
