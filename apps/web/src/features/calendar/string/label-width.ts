/** About how wide a bead's label is at its size (13 px), for placing it without laying it out. */
export function labelWidth(label: string): number {
  return label.length * 6.6 + 4;
}
