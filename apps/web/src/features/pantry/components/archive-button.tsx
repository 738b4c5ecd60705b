import { Link } from 'react-router-dom';
import * as z from 'zod/mini';
import { type UsedBy, usedBy } from '#shared/contracts/pantry.ts';
import { Button } from '#web/components/ui/button.tsx';
import { Failure } from '#web/components/ui/failure.tsx';
import { Notice } from '#web/components/ui/notice.tsx';
import { paths } from '#web/config/paths.ts';
import { ApiProblem } from '#web/lib/http.ts';

type Props = {
  readonly archived: boolean;
  readonly pending: boolean;
  readonly onArchive: (archived: boolean) => void;
};

/** Off the shelf or back on it; at once, since either is undone by the other. */
export function ArchiveButton({ archived, pending, onArchive }: Props) {
  return (
    <Button kind="quiet" pending={pending} onClick={() => onArchive(!archived)}>
      {archived ? 'Take it back into use' : 'Archive'}
    </Button>
  );
}

const kindWords: Readonly<Record<UsedBy['kind'], string>> = {
  formula: 'formula',
  sponge: 'sponge on the menu',
  filling: 'filling on the menu',
  style: 'buttercream on the menu',
  covering: 'covering on the menu',
  decoration: 'decoration',
};

/** Why something was not archived: what still uses it. */
export function ArchiveFailure({ error }: { readonly error: unknown }) {
  const users = error instanceof ApiProblem ? usersOf(error) : [];
  if (users.length === 0) return <Failure error={error} />;
  return (
    <Notice tone="butter" live="assertive" title="Something still uses it, so it stays in use">
      <ul className="grid gap-1">
        {users.map((it) => (
          <li key={`${it.kind} ${it.id}`}>
            {it.kind === 'formula' ? (
              <Link to={paths.staffFormula(it.id)}>{it.name}</Link>
            ) : (
              it.name
            )}
            , {kindWords[it.kind]}
          </li>
        ))}
      </ul>
    </Notice>
  );
}

function usersOf(error: ApiProblem): readonly UsedBy[] {
  const read = z.array(usedBy).safeParse(error.facts['usedBy']);
  return read.success ? read.data : [];
}
