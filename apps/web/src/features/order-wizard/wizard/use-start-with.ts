import { useEffect, useRef, useState } from 'react';
import type { UseFormReturn } from 'react-hook-form';
import { useLocation } from 'react-router-dom';
import type { Menu } from '#shared/contracts/menu.ts';
import { useToast } from '#web/components/ui/toast.tsx';
import type { OrderForm } from '../draft/empty-order.ts';

/**
 * Puts the cake of a link from the menu into the order, with Undo. Few come by one, so what reads
 * the link is loaded only then.
 */
export function useStartWith(form: UseFormReturn<OrderForm>, menu: Menu): void {
  const { hash } = useLocation();
  // As it was when the order was opened: the address goes on to a step at once.
  const [link] = useState(hash);
  const taken = useRef(false);
  const toast = useToast();

  useEffect(() => {
    if (link === '' || taken.current) return undefined;
    let here = true;
    const take = async () => {
      const { startWith } = await import('../design/start-with.ts');
      if (!here) return;
      taken.current = true;
      const before = structuredClone(form.getValues());
      const begun = startWith(link, before, menu);
      if (begun === null) return;
      const put = ({ cake, setting, day }: OrderForm) => {
        form.setValue('cake', cake);
        form.setValue('setting', setting);
        form.setValue('day.allergies', day.allergies);
      };
      put(begun);
      toast({
        message: 'Your cake from the menu is in the order; say how many will eat it.',
        onUndo: () => put(before),
      });
    };
    take().catch(() => {
      if (here) toast({ message: 'Your cake from the menu could not be put into the order.' });
    });
    return () => {
      here = false;
    };
  }, [link, form, menu, toast]);
}
