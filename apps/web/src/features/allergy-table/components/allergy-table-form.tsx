import { useCallback, useState } from 'react';
import { saveAllergyTable, type AllergyTable } from '#shared/contracts/allergy-table.ts';
import type { StudioCard } from '#shared/contracts/menu.ts';
import { Button } from '#web/components/ui/button.tsx';
import { Failure } from '#web/components/ui/failure.tsx';
import { FormErrorSummary } from '#web/components/ui/form-error-summary.tsx';
import { Notice } from '#web/components/ui/notice.tsx';
import { Section } from '#web/components/ui/section.tsx';
import { TextArea } from '#web/components/ui/text-area.tsx';
import { useToast } from '#web/components/ui/toast.tsx';
import type { FieldProblem } from '#web/lib/forms.ts';
import { ApiProblem } from '#web/lib/http.ts';
import { useSaveAllergyTable } from '../api/save-allergy-table.ts';
import { draftOf, type TableDraft } from '../draft/table-draft.ts';
import { AnswerTable } from './answer-table.tsx';
import { KitchenNotes } from './kitchen-notes.tsx';

type Props = {
  readonly table: AllergyTable;
  readonly studio: StudioCard;
  readonly today: string;
  /** The menu goes by the new words at once. */
  readonly onSaved: () => void;
};

/** The owner's words about allergies, saved as a whole; what was typed stays until it is saved. */
export function AllergyTableForm({ table, studio, today, onSaved }: Props) {
  const [madeFrom, setMadeFrom] = useState(table.version);
  const [draft, setDraft] = useState<TableDraft>(() => draftOf(table));
  const [attempt, setAttempt] = useState(0);
  const save = useSaveAllergyTable();
  const toast = useToast();
  const put = (change: Partial<TableDraft>) => setDraft((it) => ({ ...it, ...change }));
  // The same each time, so that typing a text leaves the eighty fields of the tables alone.
  const putRules = useCallback(
    (rules: TableDraft['rules']) => setDraft((it) => ({ ...it, rules })),
    [],
  );
  const putKitchen = useCallback(
    (kitchen: TableDraft['kitchen']) => setDraft((it) => ({ ...it, kitchen })),
    [],
  );
  const takeUp = (from: AllergyTable) => {
    setDraft(draftOf(from));
    setMadeFrom(from.version);
    setAttempt(0);
  };

  const overtaken = table.version !== madeFrom;
  const read = saveAllergyTable.safeParse({ ...draft, version: madeFrom });
  const problems: FieldProblem[] =
    attempt === 0 || read.success
      ? []
      : read.error.issues.map(({ path, message }) => ({
          name: path.map(String).join('.'),
          message,
        }));
  const errorAt = (name: string) => problems.find((it) => it.name === name)?.message;

  const send = () => {
    setAttempt((it) => it + 1);
    if (!read.success || overtaken) return;
    save.mutate(read.data, {
      onSuccess: (saved) => {
        takeUp(saved);
        onSaved();
        toast({ message: 'Saved. Orders that wait are judged by it now.' });
      },
    });
  };
  const conflict = save.error instanceof ApiProblem && save.error.code === 'changed-meanwhile';

  return (
    <form
      noValidate
      className="grid gap-10"
      onSubmit={(event) => {
        event.preventDefault();
        send();
      }}
    >
      <FormErrorSummary problems={problems} attempt={attempt} />
      {overtaken && (
        <Notice tone="butter" title="Somebody saved another table meanwhile" live="polite">
          <p>What you changed is still here. Take up theirs to go on from it.</p>
          <div>
            <Button kind="secondary" onClick={() => takeUp(table)}>
              Take up theirs
            </Button>
          </div>
        </Notice>
      )}
      <Section title="Take, talk or refuse">
        <p className="measure text-slate">
          What you answer when a cake contains what a guest told. It is a stop in any case: “take”
          lets you take it with a written reason, “talk first” wants a recorded talk before that,
          and “refuse” keeps everybody from taking it. Anaphylaxis and{' '}
          {studio.labelRegion === 'US' ? 'celiac' : 'coeliac'} disease are talked over even where an
          allergen is only handled here.
        </p>
        <AnswerTable rules={draft.rules} region={studio.labelRegion} onRules={putRules} />
      </Section>
      <Section title="What the kitchen handles">
        <p className="measure text-slate">
          Everything your labels name counts by itself. Add what else is handled here. Write “may
          contain” on a label only where the risk assessment is noted (FSA guidance, 2023).
        </p>
        <KitchenNotes
          kitchen={draft.kitchen}
          fromLabels={table.fromLabels}
          region={studio.labelRegion}
          locale={studio.locale}
          today={today}
          onKitchen={putKitchen}
        />
      </Section>
      <Section title="In your words">
        <div className="measure grid gap-6">
          <TextArea
            name="kitchenNotice"
            label="Of the kitchen, wherever contents are shown"
            rows={4}
            value={draft.kitchenNotice}
            error={errorAt('kitchenNotice')}
            onChange={(event) => put({ kitchenNotice: event.target.value })}
          />
          <TextArea
            name="homeKitchenText"
            label="Where it is made, for labels"
            hint="What a home kitchen must say differs by place: ask your local authority for its words and put them here as they are."
            optional
            rows={3}
            value={draft.homeKitchenText}
            error={errorAt('homeKitchenText')}
            onChange={(event) => put({ homeKitchenText: event.target.value })}
          />
          <TextArea
            name="eggAdvisory"
            label="The advisory for raw or undercooked egg"
            hint={
              studio.labelRegion === 'US'
                ? 'FDA Food Code 3-603.11 asks for one; your local code decides on the words.'
                : 'Your local code decides whether it is asked for, and on the words.'
            }
            rows={3}
            value={draft.eggAdvisory}
            error={errorAt('eggAdvisory')}
            onChange={(event) => put({ eggAdvisory: event.target.value })}
          />
        </div>
      </Section>
      <div className="grid gap-3">
        {save.isError && !conflict && <Failure error={save.error} />}
        <div>
          <Button type="submit" pending={save.isPending}>
            Save the table
          </Button>
        </div>
      </div>
    </form>
  );
}
