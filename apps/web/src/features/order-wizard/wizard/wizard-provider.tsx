import { type ReactNode, useCallback, useEffect, useMemo, useRef, useState } from 'react';
import { FormProvider, useForm } from 'react-hook-form';
import type { Menu } from '#shared/contracts/menu.ts';
import { today as todayIn } from '#shared/dates/local-time.ts';
import { useToast } from '#web/components/ui/toast.tsx';
import type { OrderStep } from '#web/config/paths.ts';
import { designOf } from '../design/design-of.ts';
import { fitToMenu } from '../design/fit-to-menu.ts';
import { DraftKeeper } from '../draft/draft-keeper.ts';
import type { DraftRecord, KeptPicture, SendAttempt } from '../draft/draft-record.ts';
import { deviceShelf } from '../draft/draft-storage.ts';
import { emptyOrder, isUntouched, type OrderForm } from '../draft/empty-order.ts';
import { orderResolver } from '../draft/order-resolver.ts';
import { laterStep } from '../steps/steps.ts';
import { same } from './same.ts';
import { useEstimate } from './use-estimate.ts';
import { usePhotoQueue } from './use-photo-queue.ts';
import { useStartWith } from './use-start-with.ts';
import { useStable } from './use-stable.ts';
import { type Wizard, WizardContext } from './wizard-context.ts';

/** Who is signed in, so that nothing known is asked again. */
export type Customer = { readonly name: string; readonly email: string };

type Props = {
  readonly menu: Menu;
  readonly customer: Customer | null;
  readonly children: ReactNode;
};

/** What the draft holds besides the answers. */
type Aside = {
  readonly reached: OrderStep;
  readonly pictures: Readonly<Record<string, KeptPicture>>;
  readonly attempt: SendAttempt | null;
};

const emptyAside: Aside = { reached: 'day', pictures: {}, attempt: null };

function asideOf(record: DraftRecord | null): Aside {
  if (record === null) return emptyAside;
  const { reached, pictures, attempt } = record;
  return { reached, pictures, attempt };
}

function later(run: () => void, ms: number): () => void {
  const timer = setTimeout(run, ms);
  return () => clearTimeout(timer);
}

/** Restores the draft once, when the wizard opens. */
function begin(menu: Menu, customer: Customer | null) {
  const shelf = deviceShelf();
  const restored = shelf.read();
  const keeper = new DraftKeeper(
    { shelf, writer: crypto.randomUUID(), now: Date.now, later },
    restored,
  );
  const { values, gone } = fitToMenu(restored?.values ?? emptyOrder(), menu);
  return { keeper, values: introduce(values, customer), gone, aside: asideOf(restored) };
}

/** Fills in the name and address of whoever is signed in, where nothing was written yet. */
function introduce(values: OrderForm, customer: Customer | null): OrderForm {
  if (customer === null) return values;
  const { you } = values;
  return {
    ...values,
    you: { ...you, name: you.name || customer.name, email: you.email || customer.email },
  };
}

/** The wizard's state: one form, kept on the device, with its design, estimate and photos. */
export function WizardProvider({ menu, customer, children }: Props) {
  const [start] = useState(() => begin(menu, customer));
  const { keeper } = start;
  const form = useForm<OrderForm>({ defaultValues: start.values, resolver: orderResolver });
  const [values, setValues] = useState(start.values);
  const [aside, setAside] = useState(start.aside);
  const [today] = useState(() => todayIn(new Date(), menu.studio.zone));
  const toast = useToast();

  useEffect(
    () =>
      form.subscribe({
        formState: { values: true },
        // Told of errors too, and the form changes its values in place: a copy, if they changed.
        callback: (state) =>
          setValues((last) => (same(last, state.values) ? last : structuredClone(state.values))),
      }),
    [form],
  );

  useStartWith(form, menu);

  useEffect(() => {
    if (start.gone.length > 0) {
      toast({ message: `No longer on the menu, so taken out: ${start.gone.join(', ')}.` });
    }
  }, [start, toast]);

  // Somebody signed in on another page meanwhile.
  useEffect(() => {
    const introduced = introduce(form.getValues(), customer);
    if (introduced.you.name !== form.getValues('you.name')) {
      form.setValue('you.name', introduced.you.name);
    }
    if (introduced.you.email !== form.getValues('you.email')) {
      form.setValue('you.email', introduced.you.email);
    }
  }, [form, customer]);

  const touched = useRef(false);
  useEffect(() => {
    touched.current ||= !isUntouched(values);
    if (touched.current) keeper.keep({ values, ...aside });
  }, [keeper, values, aside]);

  useEffect(() => keeper.listen(), [keeper]);
  useEffect(() => {
    const keepNow = () => keeper.flush();
    window.addEventListener('pagehide', keepNow);
    document.addEventListener('visibilitychange', keepNow);
    return () => {
      window.removeEventListener('pagehide', keepNow);
      document.removeEventListener('visibilitychange', keepNow);
      keeper.flush();
    };
  }, [keeper]);

  const change = useCallback<Wizard['change']>(
    (sections, undo) => {
      const before = structuredClone(form.getValues());
      const put = (from: Partial<OrderForm>) => {
        for (const name of sectionNames) {
          const section = from[name];
          if (name in sections && section !== undefined) form.setValue(name, section);
        }
      };
      put(sections);
      if (undo !== undefined) toast({ message: undo, onUndo: () => put(before) });
    },
    [form, toast],
  );

  const replace = useCallback((next: OrderForm) => form.reset(next), [form]);

  const reach = useCallback(
    (step: OrderStep) =>
      setAside((last) => {
        const reached = laterStep(last.reached, step);
        return reached === last.reached ? last : { ...last, reached };
      }),
    [],
  );

  const noteAttempt = useCallback(
    (attempt: SendAttempt | null) => {
      setAside((last) => ({ ...last, attempt }));
      // On the shelf before the request leaves: the page may not live to hear the answer.
      keeper.keep({ values: form.getValues(), ...aside, attempt });
      keeper.flush();
    },
    [keeper, form, aside],
  );

  const onArrived = useCallback(
    (id: string, claimKey: string, picture: KeptPicture) => {
      setAside((last) => ({ ...last, pictures: { ...last.pictures, [id]: picture } }));
      const photos = form.getValues('photos');
      form.setValue('photos', [...photos, { id, claimKey, note: '' }]);
    },
    [form],
  );
  const queue = usePhotoQueue(onArrived, later);

  const startOver = useCallback(() => {
    const before = { values: structuredClone(form.getValues()), aside };
    queue.clear();
    keeper.clear();
    touched.current = false;
    form.reset(introduce(emptyOrder(), customer));
    setAside(emptyAside);
    toast({
      message: 'The form is empty again.',
      onUndo: () => {
        form.reset(before.values);
        setAside(before.aside);
      },
    });
  }, [form, aside, queue, keeper, customer, toast]);

  const takeOther = useCallback(() => {
    const other = keeper.takeOther();
    const fitted = fitToMenu(other?.values ?? emptyOrder(), menu);
    touched.current = false;
    form.reset(introduce(fitted.values, customer));
    setAside(asideOf(other));
  }, [keeper, menu, form, customer]);

  const finish = useCallback(() => {
    queue.clear();
    keeper.clear();
    touched.current = false;
    form.reset(introduce(emptyOrder(), customer));
    setAside(emptyAside);
  }, [form, queue, keeper, customer]);

  const design = useStable(useMemo(() => designOf(values, aside.reached), [values, aside.reached]));
  const wanted = aside.reached !== 'day';
  const running = useEstimate(design, values.day, today, menu, wanted);

  const wizard = useMemo<Wizard>(
    () => ({
      menu,
      today,
      values,
      design,
      running,
      ...aside,
      reach,
      change,
      replace,
      keeper,
      queue,
      noteAttempt,
      startOver,
      takeOther,
      finish,
    }),
    [
      menu,
      today,
      values,
      design,
      running,
      aside,
      reach,
      change,
      replace,
      keeper,
      queue,
      noteAttempt,
      startOver,
      takeOther,
      finish,
    ],
  );

  return (
    <WizardContext value={wizard}>
      <FormProvider {...form}>{children}</FormProvider>
    </WizardContext>
  );
}

const sectionNames = [
  'day',
  'cake',
  'setting',
  'look',
  'extras',
  'photos',
  'you',
  'consents',
  'askWithoutDate',
] as const satisfies readonly (keyof OrderForm)[];
