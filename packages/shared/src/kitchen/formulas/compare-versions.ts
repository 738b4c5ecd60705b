import type { FormulaVersion } from '#shared/contracts/pantry.ts';
import type { PantryIndex } from './pantry-index.ts';

/** One thing that is different between two versions, in words. */
export type VersionChange = {
  readonly kind:
    | 'line'
    | 'step'
    | 'order'
    | 'yield'
    | 'keeping'
    | 'limit'
    | 'look'
    | 'note'
    | 'contents'
    | 'cost';
  readonly text: string;
};

/** What a later version does otherwise than an earlier one, most telling first. */
export function compareVersions(
  _before: FormulaVersion,
  _after: FormulaVersion,
  _index: PantryIndex,
): VersionChange[] {
  return [];
}
