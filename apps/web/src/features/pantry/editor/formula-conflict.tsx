import type { FormulaDraft, FormulaVersion } from '#shared/contracts/pantry.ts';
import { compareVersions } from '#shared/kitchen/formulas/compare-versions.ts';
import { Button } from '#web/components/ui/button.tsx';
import { DialogActions } from '#web/components/ui/dialog-actions.tsx';
import { Dialog } from '#web/components/ui/dialog.tsx';
import { ChangeList } from '../formulas/change-list.tsx';
import { type House, compareWords } from '../house.ts';
import type { Shelf } from '../shelf.ts';
import { asVersion } from './editor-form.ts';

type Props = {
  readonly base: FormulaVersion;
  readonly theirs: FormulaVersion;
  readonly mine: FormulaDraft;
  readonly shelf: Shelf;
  readonly house: House;
  readonly onMine: () => void;
  readonly onTheirs: () => void;
  readonly onClose: () => void;
};

/** Somebody saved a version meanwhile: what each of the two did, and nothing lost either way. */
export function FormulaConflict(props: Props) {
  const { base, theirs, mine, shelf, house, onMine, onTheirs, onClose } = props;
  const words = compareWords(house);
  const by = theirs.createdBy === '' ? 'Somebody' : theirs.createdBy;
  return (
    <Dialog open wide onClose={onClose} title="Somebody changed this meanwhile">
      <div className="grid gap-6 sm:grid-cols-2">
        <section className="grid content-start gap-2">
          <h3>
            {by} saved version {theirs.n}
          </h3>
          <ChangeList changes={compareVersions(base, theirs, shelf.index, words)} />
        </section>
        <section className="grid content-start gap-2">
          <h3>What you have written</h3>
          <ChangeList
            changes={compareVersions(base, asVersion(mine, base.formulaId), shelf.index, words)}
          />
        </section>
      </div>
      <p className="measure text-slate">
        Both told against version {base.n}. Going on keeps what you wrote and tells its differences
        from version {theirs.n}, which stays among the versions. Nothing is saved until you save.
      </p>
      <DialogActions>
        <Button onClick={onMine}>Go on with mine</Button>
        <Button kind="secondary" onClick={onTheirs}>
          Drop mine, take version {theirs.n}
        </Button>
        <Button kind="quiet" onClick={onClose}>
          Close
        </Button>
      </DialogActions>
    </Dialog>
  );
}
