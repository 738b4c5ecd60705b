/** "Top tier", "Bottom tier", "Middle tier", "Tier 2 from the board"; "The tier" where it is alone. */
export function tierName(at: number, of: number): string {
  if (of === 1) return 'The tier';
  if (at === 0) return 'Bottom tier';
  if (at === of - 1) return 'Top tier';
  return of === 3 ? 'Middle tier' : `Tier ${at + 1} from the board`;
}
