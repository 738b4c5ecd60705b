/** Joins the class names that apply. */
export function classNames(...names: readonly (string | false | null | undefined)[]): string {
  return names
    .filter((name) => name !== false && name !== null && name !== undefined && name !== '')
    .join(' ');
}
