import { useState } from 'react';
import { Link } from 'react-router-dom';
import type { FormulaVersion } from '#shared/contracts/pantry.ts';
import { compareVersions } from '#shared/kitchen/formulas/compare-versions.ts';
import { Section } from '#web/components/ui/section.tsx';
import { Select } from '#web/components/ui/select.tsx';
import { paths } from '#web/config/paths.ts';
import { classNames } from '#web/lib/class-names.ts';
import { type House, compareWords } from '../house.ts';
import type { KeptFormula, Shelf } from '../shelf.ts';
import { ChangeList } from './change-list.tsx';
import { versionDate } from './formula-words.ts';

type Props = {
  readonly kept: KeptFormula;
  /** The one on the page. */
  readonly shown: FormulaVersion;
  readonly shelf: Shelf;
  readonly house: House;
};

/** Every version there was, and what any two of them do differently. */
export function VersionHistory({ kept, shown, shelf, house }: Props) {
  const { versions, current } = kept;
  const [from, setFrom] = useState(versions[1]?.id ?? '');
  const [to, setTo] = useState(current.id);
  const before = versions.find((it) => it.id === from);
  const after = versions.find((it) => it.id === to);
  return (
    <Section title="Versions" className="print:hidden">
      <ol className="border-t border-seam">
        {versions.map((it) => (
          <li
            key={it.id}
            className={classNames(
              'flex flex-wrap items-center gap-x-5 gap-y-1 border-b border-seam py-1.5',
              it.id === shown.id && 'bg-cobalt-tint px-3',
            )}
          >
            <span className="min-w-24 font-display font-semibold tabular-nums">Version {it.n}</span>
            <span className="min-w-0 grow text-sm text-slate">
              {versionDate(it.createdAt, house)}
              {it.createdBy !== '' && `, ${it.createdBy}`}
              {it.id === current.id && ', the one in use'}
            </span>
            {it.id !== shown.id && (
              <Link
                to={it.id === current.id ? '?' : `?version=${it.n}`}
                className="link inline-flex min-h-11 items-center text-sm"
              >
                Look at version {it.n}
              </Link>
            )}
            {shelf.pantry.can.save && it.id !== current.id && (
              <Link
                to={`${paths.staffFormulaEdit(kept.formula.id)}?from=${it.n}`}
                className="link inline-flex min-h-11 items-center text-sm"
              >
                Begin from it
              </Link>
            )}
          </li>
        ))}
      </ol>
      {versions.length > 1 && (
        <>
          <h3>What changed</h3>
          <div className="flex flex-wrap items-end gap-3">
            <VersionSelect label="from" value={from} versions={versions} onValue={setFrom} />
            <VersionSelect label="to" value={to} versions={versions} onValue={setTo} />
          </div>
          {before !== undefined && after !== undefined && (
            <ChangeList
              changes={compareVersions(before, after, shelf.index, compareWords(house))}
            />
          )}
        </>
      )}
    </Section>
  );
}

type SelectProps = {
  readonly label: string;
  readonly value: string;
  readonly versions: readonly FormulaVersion[];
  readonly onValue: (id: string) => void;
};

function VersionSelect({ label, value, versions, onValue }: SelectProps) {
  return (
    <Select label={label} value={value} onChange={(event) => onValue(event.target.value)}>
      {versions.map((it) => (
        <option key={it.id} value={it.id}>
          Version {it.n}
        </option>
      ))}
    </Select>
  );
}
