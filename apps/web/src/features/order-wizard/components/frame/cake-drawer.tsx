import { Drawer } from '#web/components/ui/drawer.tsx';
import type { OrderStep } from '#web/config/paths.ts';
import { useWizard } from '../../wizard/wizard-context.ts';
import { CakePanel } from './cake-panel.tsx';
import { panelTitle } from './panel-title.ts';

type Props = {
  readonly step: OrderStep;
  readonly open: boolean;
  readonly onClose: () => void;
};

/** The cake so far, on a phone: the drawing, the estimate and the advice in a drawer. */
export function CakeDrawer({ step, open, onClose }: Props) {
  const { values, design } = useWizard();
  return (
    <Drawer open={open} onClose={onClose} title={panelTitle(values, design)}>
      <CakePanel step={step} onLeave={onClose} />
    </Drawer>
  );
}
