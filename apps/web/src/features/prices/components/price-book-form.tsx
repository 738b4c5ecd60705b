import { useEffect, useMemo, useState } from 'react';
import type { Menu } from '#shared/contracts/menu.ts';
import { priceBookForm, type PriceBookContent, type PricesView } from '#shared/contracts/prices.ts';
import { Button } from '#web/components/ui/button.tsx';
import { Failure } from '#web/components/ui/failure.tsx';
import { FormErrorSummary } from '#web/components/ui/form-error-summary.tsx';
import { Notice } from '#web/components/ui/notice.tsx';
import { Rim } from '#web/components/ui/rim.tsx';
import { Section } from '#web/components/ui/section.tsx';
import { useToast } from '#web/components/ui/toast.tsx';
import type { FieldProblem } from '#web/lib/forms.ts';
import { ApiProblem } from '#web/lib/http.ts';
import { useSavePrices } from '../api/save-prices.ts';
import { keepDraft, readKeptDraft } from '../draft/kept-draft.ts';
import { PriceDraftContext, type PriceDraft } from '../draft/price-draft.ts';
import { CostFields } from './cost-fields.tsx';
import { DecorationPrices } from './decoration-prices.tsx';
import { OrderRules } from './order-rules.tsx';
import { PortionPrices } from './portion-prices.tsx';
import { Surcharges } from './surcharges.tsx';
import { TaxFields } from './tax-fields.tsx';
import { VersionList } from './version-list.tsx';
import { WhatChanges } from './what-changes.tsx';

type Props = {
  readonly prices: PricesView;
  readonly menu: Menu;
  readonly today: string;
  /** The menu goes by the new book at once. */
  readonly onSaved: () => void;
};

const problemsOf = (issues: readonly { path: readonly PropertyKey[]; message: string }[]) =>
  issues.map(({ path, message }): FieldProblem => ({ name: path.map(String).join('.'), message }));

/** The price book, written anew over the one in force, with what that does to three cakes. */
export function PriceBookForm({ prices, menu, today, onSaved }: Props) {
  const [kept] = useState(() => readKeptDraft(prices.n));
  const [madeFrom, setMadeFrom] = useState(prices.n);
  const [content, setContent] = useState<PriceBookContent>(kept ?? prices.content);
  const [fromServer, setFromServer] = useState<readonly FieldProblem[]>([]);
  const [attempt, setAttempt] = useState(0);
  // A book taken up anew has fields of its own: nothing half typed is carried over.
  const [afresh, setAfresh] = useState(0);
  const save = useSavePrices();
  const toast = useToast();

  const read = useMemo(() => priceBookForm.safeParse(content), [content]);
  const found = read.success ? fromServer : problemsOf(read.error.issues);
  const shown = attempt === 0 ? [] : found;
  const unchanged = JSON.stringify(content) === JSON.stringify(prices.content);
  const overtaken = prices.n !== madeFrom;

  useEffect(() => keepDraft(madeFrom, unchanged ? null : content), [madeFrom, content, unchanged]);

  const takeUp = (from: PricesView) => {
    setContent(from.content);
    setMadeFrom(from.n);
    setAttempt(0);
    setAfresh((it) => it + 1);
  };
  const put: PriceDraft['put'] = (change) => {
    setFromServer([]);
    setContent((it) => ({ ...it, ...change }));
  };
  const send = () => {
    setAttempt((it) => it + 1);
    if (!read.success || overtaken) return;
    if (unchanged) {
      toast({ message: 'Nothing has changed, so the book stays as it is.' });
      return;
    }
    save.mutate(
      { madeFrom, content: read.data },
      {
        onSuccess: (saved) => {
          takeUp(saved);
          onSaved();
          toast({ message: `Saved as version ${saved.n}; the menu goes by it now.` });
        },
        onError: (error) => {
          if (!(error instanceof ApiProblem)) return;
          setFromServer(
            problemsOf(error.issues.map(({ path, message }) => ({ path: path.slice(1), message }))),
          );
        },
      },
    );
  };

  const draft: PriceDraft = {
    content,
    prices,
    menu,
    put,
    problemAt: (place) => shown.find(({ name }) => name === place)?.message,
  };
  const failure =
    save.error instanceof ApiProblem && save.error.issues.length > 0 ? null : save.error;
  const { zone, locale } = menu.studio;
  return (
    <PriceDraftContext value={draft}>
      <form
        noValidate
        className="grid items-start gap-x-12 gap-y-10 lg:grid-cols-[minmax(0,1fr)_22rem]"
        onSubmit={(event) => {
          event.preventDefault();
          send();
        }}
      >
        <div className="grid min-w-0 gap-12">
          <FormErrorSummary problems={shown} attempt={attempt} />
          {overtaken && (
            <Overtaken
              prices={prices}
              onKeep={() => setMadeFrom(prices.n)}
              onTake={() => takeUp(prices)}
            />
          )}
          {kept !== null && !unchanged && !overtaken && (
            <Notice title="What you had begun is still here">
              <div>
                <Button kind="secondary" onClick={() => takeUp(prices)}>
                  Begin again with the prices in force
                </Button>
              </div>
            </Notice>
          )}
          <div key={afresh} className="grid gap-12">
            <PortionPrices />
            <Surcharges />
            <DecorationPrices />
            <OrderRules />
            <TaxFields />
            <CostFields />
          </div>
        </div>
        <div className="grid gap-8 lg:sticky lg:top-6 lg:max-h-[calc(100dvh-3rem)] lg:overflow-y-auto lg:pb-2">
          <Rim label="What changes" className="grid gap-4 p-4 sm:p-5">
            <h2>What changes</h2>
            <WhatChanges next={read.success ? read.data : null} today={today} />
            {failure !== null && !overtaken && <Failure error={failure} />}
            <Button type="submit" wide pending={save.isPending}>
              Save the prices
            </Button>
            <p className="text-sm text-slate">
              The menu and new estimates go by them at once. Orders already sent keep the prices
              they were offered.
            </p>
          </Rim>
          <Section title="The books so far">
            <VersionList prices={prices} zone={zone} locale={locale} />
          </Section>
        </div>
      </form>
    </PriceDraftContext>
  );
}

/** Somebody saved meanwhile: what was typed stays until it is decided which goes on. */
function Overtaken({
  prices,
  onKeep,
  onTake,
}: {
  readonly prices: PricesView;
  readonly onKeep: () => void;
  readonly onTake: () => void;
}) {
  const by = prices.versions[0]?.by;
  return (
    <Notice
      tone="butter"
      live="assertive"
      title={`${by ?? 'Somebody'} saved version ${prices.n} meanwhile`}
    >
      <p>What you typed is still here. “What changes” shows how it differs from theirs.</p>
      <div className="flex flex-wrap gap-3">
        <Button kind="secondary" onClick={onTake}>
          Take theirs
        </Button>
        <Button kind="secondary" onClick={onKeep}>
          Go on with mine
        </Button>
      </div>
    </Notice>
  );
}
