import { useState } from 'react';
import { Link } from 'react-router-dom';
import * as z from 'zod/mini';
import { Button } from '#web/components/ui/button.tsx';
import { Dialog } from '#web/components/ui/dialog.tsx';
import { errorOf } from '#web/components/ui/form-problems.tsx';
import { TextField } from '#web/components/ui/text-field.tsx';
import { useToast } from '#web/components/ui/toast.tsx';
import { paths } from '#web/config/paths.ts';
import { classNames } from '#web/lib/class-names.ts';
import { useContractForm } from '#web/lib/use-contract-form.ts';
import {
  type SavedView,
  keepViews,
  readViews,
  savedView,
  withView,
} from '../search/saved-views.ts';

/** Views that every studio needs; they cannot be taken away. */
const always: readonly SavedView[] = [
  { name: 'All', search: '' },
  { name: 'To answer', search: 'sort=created&order=asc&status=asked' },
  { name: 'In hand', search: 'sort=pickup&order=asc&status=confirmed&status=making&status=ready' },
];

/** Named ways to look at the orders; own ones are kept on this device. */
export function ViewBar({ search }: { readonly search: string }) {
  const [views, setViews] = useState(() => readViews(window.localStorage));
  const [naming, setNaming] = useState(false);
  const toast = useToast();
  const own = views.find((it) => it.search === search);
  const known = own !== undefined || always.some((it) => it.search === search);

  const keep = (next: readonly SavedView[]) => {
    setViews(next);
    if (!keepViews(window.localStorage, next)) {
      toast({ message: 'This device keeps nothing, so the view lasts until you close the page.' });
    }
  };

  return (
    <div className="flex flex-wrap items-center gap-x-1 gap-y-1">
      <nav aria-label="Views" className="-mx-2 flex flex-wrap items-center sm:mx-0">
        {[...always, ...views].map((it) => (
          <Link
            key={`${it.name} ${it.search}`}
            to={it.search === '' ? paths.staffOrders : `${paths.staffOrders}?${it.search}`}
            aria-current={it.search === search ? 'page' : undefined}
            className={classNames(
              'inline-flex min-h-11 items-center border-b-3 px-2 font-semibold',
              it.search === search
                ? 'border-butter text-ink'
                : 'border-transparent text-slate hover:border-seam',
            )}
          >
            {it.name}
          </Link>
        ))}
      </nav>
      {!known && (
        <Button kind="quiet" onClick={() => setNaming(true)}>
          Save this view
        </Button>
      )}
      {own !== undefined && (
        <Button
          kind="quiet"
          onClick={() => {
            keep(views.filter((it) => it !== own));
            toast({
              message: `“${own.name}” is taken off this device.`,
              onUndo: () => keep(withView(views, own)),
            });
          }}
        >
          Forget this view
        </Button>
      )}
      {naming && (
        <NameView
          onClose={() => setNaming(false)}
          onName={(name) => {
            keep(withView(views, { name, search }));
            setNaming(false);
          }}
        />
      )}
    </div>
  );
}

const nameForm = z.pick(savedView, { name: true });

type NameProps = { readonly onClose: () => void; readonly onName: (name: string) => void };

function NameView({ onClose, onName }: NameProps) {
  const { form, submit } = useContractForm(nameForm, { name: '' });
  return (
    <Dialog open onClose={onClose} title="Save this view">
      <form
        noValidate
        className="grid gap-4"
        onSubmit={submit((values) => Promise.resolve(onName(values.name)))}
      >
        <TextField
          {...form.register('name')}
          label="Its name"
          hint="It is kept on this device, for whoever uses it."
          autoComplete="off"
          error={errorOf(form.formState.errors, 'name')}
        />
        <div className="flex flex-wrap gap-3">
          <Button type="submit">Save it</Button>
          <Button kind="quiet" onClick={onClose}>
            Not now
          </Button>
        </div>
      </form>
    </Dialog>
  );
}
